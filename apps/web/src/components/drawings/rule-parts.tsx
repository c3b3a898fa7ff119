import { along, LEFT, mainLines, PITCHES, readable, RIGHT } from './vernier';

const ink = 'var(--hp-colors-fg)';
const quiet = 'var(--hp-colors-fg-muted)';
const steel = 'var(--hp-colors-steel-solid)';
const pitches = Array.from({ length: PITCHES + 1 }, (_, i) => i);
const PITCH = (RIGHT - LEFT) / PITCHES;
/** Where the enlarged scale lies, drawing units from the top. */
export const BASE = 128;

function Chain({ value }: { value: number }) {
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
        <circle key={i} cx={pin(i)} cy="15" r={i === PITCHES ? 3 : 2.2} fill={i === PITCHES ? steel : ink} />
      ))}
    </g>
  );
}

/** The chain at its true length above a 12-inch rule: what the bare eye sees of the lengthening. */
export function ChainOnRule({ value }: { value: number }) {
  return (
    <g>
      <Chain value={value} />
      <rect
        x={LEFT - 8}
        y="27"
        width={RIGHT - LEFT + 24}
        height="26"
        rx="2"
        fill="var(--hp-colors-bg-muted)"
        stroke={quiet}
      />
      {pitches.map((i) => (
        <g key={i}>
          <path d={`M${LEFT + i * PITCH} 27v${i % 2 ? 5 : 9}`} stroke={ink} />
          {i % 6 === 0 && (
            <text x={LEFT + i * PITCH} y="49" fontSize="13" textAnchor="middle" fill={quiet}>
              {i === PITCHES ? '12″' : i / 2}
            </text>
          )}
        </g>
      ))}
    </g>
  );
}

/** From the rule's last hundredths to the scale that shows them large. */
export function Lens({ end }: { end: number }) {
  const tip = RIGHT + (end / 100) * (RIGHT - LEFT);
  return (
    <path
      d={`M${RIGHT} 53L${LEFT} ${BASE}H${RIGHT}L${tip} 53Z`}
      fill="var(--hp-colors-steel-subtle)"
      stroke="var(--hp-colors-border)"
    />
  );
}

/** The enlarged scale in tenths of a percent, its words every half but where the limit stands. */
export function MainScale({ end, limit }: { end: number; limit: number }) {
  const halves = mainLines(end).filter((_, i) => i % 5 === 0);
  return (
    <g>
      <path d={`M${LEFT} ${BASE}H${RIGHT}`} stroke={ink} strokeWidth="1.5" />
      {mainLines(end).map((pct, i) => (
        <path
          key={pct}
          d={`M${along(pct, end)} ${BASE}v${i % 5 ? -9 : -16}`}
          stroke={ink}
          strokeWidth="1.25"
        />
      ))}
      {halves
        .filter((pct) => Math.abs(along(pct, end) - along(limit, end)) > 20)
        .map((pct) => (
          <text key={pct} x={along(pct, end)} y={BASE - 20} fontSize="14" fill={quiet} textAnchor="middle">
            {pct === 0 ? 'new' : pct}
          </text>
        ))}
    </g>
  );
}
