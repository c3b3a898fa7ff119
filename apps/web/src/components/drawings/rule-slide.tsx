import { elongation } from '../../app/format';
import { BASE } from './rule-parts';
import { along, meeting, slideLines } from './vernier';

const ink = 'var(--hp-colors-fg)';
const steel = 'var(--hp-colors-steel-solid)';

/** The slide at the value: its line that meets the scale above tells the hundredths. */
export function Slide({ value, end }: { value: number; end: number }) {
  const lines = slideLines(value);
  const [from, to] = [along(lines[0]!, end), along(lines[10]!, end)];
  return (
    <g>
      <rect
        x={from - 7}
        y={BASE}
        width={to - from + 14}
        height="38"
        rx="3"
        fill="var(--hp-colors-bg-panel)"
        stroke={steel}
        strokeWidth="1.5"
      />
      {lines.map((pct, i) => {
        const isMeeting = i === meeting(value);
        return (
          <path
            key={i}
            d={`M${along(pct, end)} ${BASE - (isMeeting ? 9 : 0)}v${isMeeting ? 24 : i % 5 ? 7 : 11}`}
            stroke={isMeeting ? steel : ink}
            strokeWidth={isMeeting ? 3 : 1.25}
          />
        );
      })}
      <path d={`M${from} ${BASE + 1}l-6 12h12z`} fill={steel} />
      <text x={from - 2} y={BASE + 32} fontSize="16" fontWeight="600" fill={steel}>
        {elongation(value)}
      </text>
    </g>
  );
}
