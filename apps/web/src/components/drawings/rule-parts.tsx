import { along, LEFT, mainLines, meeting, PITCHES, readable, RIGHT, slideLines } from './vernier';

const ink = 'var(--hp-colors-fg)';
const quiet = 'var(--hp-colors-fg-muted)';
const steel = 'var(--hp-colors-steel-solid)';
const pitches = Array.from({ length: PITCHES + 1 }, (_, i) => i);
const PITCH = (RIGHT - LEFT) / PITCHES;

/** The chain at its true length above a 12-inch rule: what the bare eye sees of the lengthening. */
export function ChainOnRule({ value }: { value: number }) {
  const stretched = PITCH * (1 + readable(value) / 100);
  const pin = (i: number) => LEFT + i * stretched;
  return (
    <g>
      {pitches.slice(1).map((i) => (
        <rect
          key={i}
          x={pin(i - 1) - 5}
          y={i % 2 ? 9 : 10.5}
          width={stretched + 10}
          height={i % 2 ? 12 : 9}
          rx={i % 2 ? 6 : 4.5}
          fill={i % 2 ? 'var(--hp-colors-bg-panel)' : 'var(--hp-colors-bg-emphasized)'}
          stroke="var(--hp-colors-border-control)"
        />
      ))}
      {pitches.map((i) => (
        <circle key={i} cx={pin(i)} cy="15" r="2.2" fill={i === PITCHES ? steel : ink} />
      ))}
      <rect
        x={LEFT}
        y="27"
        width={RIGHT - LEFT}
        height="17"
        fill="var(--hp-colors-bg-muted)"
        stroke={quiet}
      />
      {pitches.map((i) => (
        <path key={i} d={`M${LEFT + i * PITCH} 27v${i % 2 ? 4 : 8}`} stroke={ink} />
      ))}
    </g>
  );
}

/** The main scale in tenths of a percent, its words every half. */
export function MainScale({ end }: { end: number }) {
  return (
    <g>
      <path d={`M${LEFT} 104H${RIGHT}`} stroke={ink} strokeWidth="1.5" />
      {mainLines(end).map((pct, i) => (
        <path key={i} d={`M${along(pct, end)} 104v${i % 5 ? -9 : -16}`} stroke={ink} strokeWidth="1.25" />
      ))}
      {mainLines(end)
        .filter((_, i) => i % 5 === 0)
        .map((pct, i, all) => (
          <text
            key={pct}
            x={along(pct, end)}
            y="82"
            fontSize="15"
            fill={quiet}
            textAnchor={i === 0 ? 'start' : i === all.length - 1 ? 'end' : 'middle'}
          >
            {pct === 0 ? '0 %' : pct}
          </text>
        ))}
    </g>
  );
}

/** The slide at the value: its line that meets the main scale tells the hundredths. */
export function Slide({ value, end }: { value: number; end: number }) {
  const lines = slideLines(value);
  const [from, to] = [along(lines[0]!, end), along(lines[10]!, end)];
  return (
    <g>
      <rect
        x={from - 6}
        y="104"
        width={to - from + 12}
        height="32"
        rx="3"
        fill="var(--hp-colors-steel-subtle)"
        stroke={steel}
      />
      {lines.map((pct, i) => (
        <path
          key={i}
          d={`M${along(pct, end)} 104v${i === meeting(value) ? 16 : i % 5 ? 8 : 11}`}
          stroke={i === meeting(value) ? steel : ink}
          strokeWidth={i === meeting(value) ? 3 : 1.25}
        />
      ))}
      <text
        x={along(lines[meeting(value)]!, end)}
        y="132"
        fontSize="13"
        fontWeight="600"
        textAnchor="middle"
        fill={steel}
      >
        {meeting(value)}
      </text>
      <path d={`M${from} 106l-5.500 10h11z`} fill={steel} />
    </g>
  );
}
