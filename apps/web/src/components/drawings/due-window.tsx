import { chakra, Text } from '@chakra-ui/react';
import { useId } from 'react';
import { dayWords, windowWords } from '../../app/format';
import { Booked, CalendarLine, Today } from './calendar-parts';
import { AXIS, calendarSpan, dayScale, TO } from './calendar-line';
import type { Days } from './calendar-line';

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
  const width = Math.max(6, (to ?? TO) - from);
  const median = Math.min(1, Math.max(0, (middle - from) / width));
  return (
    <g>
      <linearGradient id={id}>
        <stop offset="0" stopColor={steel} stopOpacity="0.2" />
        <stop offset={median} stopColor={steel} stopOpacity="0.95" />
        <stop offset="1" stopColor={steel} stopOpacity={to === null ? 0 : 0.2} />
      </linearGradient>
      <rect x={from} y={AXIS - 28} width={width} height="28" fill={`url(#${id})`} />
      {[from, to].map(
        (x, i) =>
          x !== null && <path key={i} d={`M${x} ${AXIS - 30}V${AXIS}`} stroke={steel} strokeWidth="1.5" />,
      )}
    </g>
  );
}

/** When something is due: a band on a calendar line, darkest at the most likely day. */
export function DueWindow({ p10, p50, p90, today, appointment = null, label, bare = false }: DueWindowProps) {
  const span = calendarSpan({ p10, p50, p90, today, appointment });
  const at = dayScale(span);
  const booked = appointment === null ? '' : `, booked for ${dayWords(appointment, today)}`;
  const words = windowWords({ p10, p50, p90 }, today) + booked;
  return (
    <div>
      <Drawing viewBox={`0 0 480 ${AXIS + 28}`} role="img" aria-label={label ? `${label}: ${words}` : words}>
        {p10 !== null && (
          <Band from={at(p10)} middle={p50 === null ? TO : at(p50)} to={p90 === null ? null : at(p90)} />
        )}
        <CalendarLine span={span} />
        <Today x={at(today)} />
        {p50 !== null && (
          <g>
            <path d={`M${at(p50)} ${AXIS - 34}V${AXIS}`} stroke="var(--hp-colors-fg)" strokeWidth="2" />
            <circle
              cx={at(p50)}
              cy={AXIS - 37}
              r="5.5"
              fill={steel}
              stroke="var(--hp-colors-bg)"
              strokeWidth="1.5"
            />
          </g>
        )}
        {appointment !== null && <Booked x={at(appointment)} today={at(today)} />}
      </Drawing>
      {!bare && (
        <Text mt="1" fontWeight="semibold">
          {words.charAt(0).toUpperCase() + words.slice(1)}
        </Text>
      )}
    </div>
  );
}
