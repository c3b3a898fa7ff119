import { chakra, Text } from '@chakra-ui/react';
import { useId } from 'react';
import { windowWords } from '../../app/format';
import { CalendarLine } from './calendar-parts';
import type { Days } from './calendar-line';
import { calendarSpan, dayScale, TO } from './calendar-line';

interface DueWindowProps extends Days {
  /** What is due, for those who hear the page: 'Re-wax'. */
  label?: string;
  /** Without the line of words below, where they stand elsewhere. */
  bare?: boolean;
}

const steel = 'var(--hp-colors-steel-solid)';
const Drawing = chakra('svg', {
  base: { display: 'block', width: 'full', maxWidth: '34rem', height: 'auto', overflow: 'visible' },
});

/** The band from p10 to p90, darkest at the median; without an end it runs out to the right. */
function Band({ from, middle, to }: { from: number; middle: number; to: number | null }) {
  const id = useId();
  const end = to ?? TO;
  const width = Math.max(6, end - from);
  return (
    <g>
      <linearGradient id={id}>
        <stop offset="0" stopColor={steel} stopOpacity="0.22" />
        <stop
          offset={Math.min(1, Math.max(0, (middle - from) / width))}
          stopColor={steel}
          stopOpacity="0.95"
        />
        <stop offset="1" stopColor={steel} stopOpacity={to === null ? 0 : 0.22} />
      </linearGradient>
      <rect x={from} y="24" width={width} height="26" rx={to === null ? 0 : 3} fill={`url(#${id})`} />
      {[from, to].map(
        (x, i) => x !== null && <path key={i} d={`M${x} 22v30`} stroke={steel} strokeWidth="1.5" />,
      )}
    </g>
  );
}

/** When something is due: a band on a calendar line, darkest at the most likely day. */
export function DueWindow({ p10, p50, p90, today, label, bare = false }: DueWindowProps) {
  const span = calendarSpan({ p10, p50, p90, today });
  const at = dayScale(span);
  const words = windowWords({ p10, p50, p90 }, today);
  return (
    <div>
      <Drawing viewBox="0 0 480 84" role="img" aria-label={label ? `${label}: ${words}` : words}>
        {p10 !== null && (
          <Band from={at(p10)} middle={p50 === null ? TO : at(p50)} to={p90 === null ? null : at(p90)} />
        )}
        <CalendarLine span={span} today={today} />
        {p50 !== null && (
          <g>
            <path d={`M${at(p50)} 18v32`} stroke="var(--hp-colors-fg)" strokeWidth="2" />
            <circle cx={at(p50)} cy="15" r="5" fill={steel} stroke="var(--hp-colors-bg)" strokeWidth="1.5" />
          </g>
        )}
      </Drawing>
      {!bare && (
        <Text mt="1" fontWeight="semibold">
          {words.charAt(0).toUpperCase() + words.slice(1)}
        </Text>
      )}
    </div>
  );
}
