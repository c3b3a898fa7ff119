import type { ReadingMethod } from '@halfpitch/contracts';
import { ROLLER } from '../../components/drawings/link-shape';

const steel = 'var(--hp-colors-steel-solid)';
const wash = 'var(--hp-colors-steel-muted)';
const ink = 'var(--hp-colors-fg)';

/** A rule below the chain, its zero under the first pin's middle; a break stands for the pitches left out. */
export function RuleOverlay({ from, to, y }: { from: number; to: number; y: number }) {
  const line = to - 7;
  const ticks = Array.from({ length: 21 }, (_, i) => from + (i * (line - from)) / 20);
  return (
    <g>
      <rect x={from - 14} y={y + 24} width={to - from + 34} height="34" rx="2" fill={wash} stroke={steel} />
      {ticks.map((x, i) => (
        <path key={x} d={`M${x} ${y + 24}v${i % 5 === 0 ? 14 : 8}`} stroke={ink} strokeWidth="1.25" />
      ))}
      <path d={`M${from} ${y}v34M${to} ${y}v34`} stroke={steel} strokeWidth="2.5" />
      <text x={from} y={y + 53} textAnchor="middle" fontSize="14" fill={ink}>
        0
      </text>
      <text x={line} y={y + 53} textAnchor="end" fontSize="14" fill={ink}>
        12 in
      </text>
      <path
        d={`M240 ${y - 30}l-7 30l7 30l-7 34M250 ${y - 30}l-7 30l7 30l-7 34`}
        stroke="var(--hp-colors-bg-panel)"
        strokeWidth="8"
        fill="none"
      />
      <text x="240" y={y - 40} textAnchor="middle" fontSize="14" fill={ink}>
        24 pitches, middle of pin to middle of pin
      </text>
    </g>
  );
}

type Gauge = Exclude<ReadingMethod, 'steel-rule'>;
/** Where each point stands: at which pin, on which side of its roller, and which way it leans. */
const points: Record<Gauge, { pin: number; side: -1 | 1; lean: -1 | 1 | 0 }[]> = {
  'three-point': [
    { pin: 1, side: 1, lean: 0 },
    { pin: 2, side: -1, lean: 1 },
    { pin: 9, side: -1, lean: 1 },
  ],
  'two-point': [
    { pin: 1, side: 1, lean: -1 },
    { pin: 9, side: -1, lean: 1 },
  ],
  digital: [
    { pin: 1, side: 1, lean: -1 },
    { pin: 9, side: -1, lean: 1 },
  ],
  'drop-in': [
    { pin: 1, side: -1, lean: 0 },
    { pin: 9, side: -1, lean: 0 },
  ],
};
const told: Record<Gauge, string> = {
  'three-point': 'both ends lean on rollers the same way',
  'two-point': 'the points push the rollers apart',
  digital: '0.32',
  'drop-in': 'drops in, or not: never press it',
};

const arrow = (x: number, y: number, way: number) =>
  `M${x} ${y}h${16 * way}M${x + 16 * way} ${y}l${-6 * way} -5M${x + 16 * way} ${y}l${-6 * way} 5`;

interface GaugeOverlayProps {
  method: Gauge;
  pinX: (pin: number) => number;
  y: number;
}

/** A gauge above the chain, its points down between the rollers. */
export function GaugeOverlay({ method, pinX, y }: GaugeOverlayProps) {
  const [left, right] = [pinX(1) - 26, pinX(9) + 26];
  const high = method === 'drop-in' ? 20 : 0;
  return (
    <g>
      <rect
        x={left}
        y={y - 78}
        width={right - left}
        height="34"
        rx="5"
        fill={wash}
        stroke={steel}
        strokeWidth="1.5"
      />
      {points[method].map(({ pin, side, lean }, i) => {
        const x = pinX(pin) + side * (ROLLER + 4);
        const tip = i > 0 ? y + 12 - high : y + 12;
        return (
          <g key={pin}>
            <path d={`M${x - 4} ${y - 44}h8V${tip - 5}l-4 5l-4 -5z`} fill={steel} />
            {lean !== 0 && <path d={arrow(x, y + 34, lean)} stroke={ink} strokeWidth="2" fill="none" />}
          </g>
        );
      })}
      <text
        x={(left + right) / 2}
        y={y - 56}
        textAnchor="middle"
        fontSize={method === 'digital' ? 20 : 15}
        fontWeight={method === 'digital' ? 600 : 400}
        fill={ink}
      >
        {method === 'digital' ? `${told.digital} %` : told[method]}
      </text>
    </g>
  );
}
