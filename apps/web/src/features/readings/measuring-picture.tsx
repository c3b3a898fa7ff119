import { chakra } from '@chakra-ui/react';
import type { ReadingMethod } from '@halfpitch/contracts';
import { methodWords } from '../../components/trade-words';
import { PITCH, platePath, ROLLER } from '../../components/drawings/link-shape';
import { GaugeOverlay, RuleOverlay } from './picture-overlays';

const Drawing = chakra('svg', {
  base: { display: 'block', width: 'full', maxWidth: '34rem', height: 'auto', overflow: 'visible' },
});
const PINS = Array.from({ length: 11 }, (_, i) => i);
const MIDDLE = 96;
const pinX = (i: number) => 40 + i * PITCH;

const said: Record<ReadingMethod, string> = {
  'steel-rule': 'a rule from the middle of one pin to the middle of another',
  'three-point': 'a gauge whose points lean on rollers from the same side',
  'two-point': 'a gauge whose two points push rollers apart',
  digital: 'a gauge with a figure, its points between the rollers',
  'drop-in': 'a gauge hooked on a roller, its tooth over the gap',
};

function ChainRow() {
  return (
    <g>
      {PINS.slice(0, -1).map((i) => (
        <path
          key={i}
          d={platePath(pinX(i), pinX(i + 1), MIDDLE)}
          fill={`var(--hp-colors-bg-${i % 2 ? 'emphasized' : 'panel'})`}
          stroke="var(--hp-colors-border-control)"
          strokeWidth="1.5"
        />
      ))}
      {PINS.map((i) => (
        <g key={i}>
          <circle
            cx={pinX(i)}
            cy={MIDDLE}
            r={ROLLER}
            fill="var(--hp-colors-bg)"
            stroke="var(--hp-colors-fg)"
            strokeWidth="1.5"
          />
          <circle cx={pinX(i)} cy={MIDDLE} r="2.5" fill="var(--hp-colors-fg)" />
        </g>
      ))}
    </g>
  );
}

/** The chosen tool on a chain: where it is set and what it measures. */
export function MeasuringPicture({ method }: { method: ReadingMethod }) {
  return (
    <Drawing viewBox="0 0 480 170" role="img" aria-label={`${methodWords[method]}: ${said[method]}`}>
      <ChainRow />
      {method === 'steel-rule' ? (
        <RuleOverlay from={pinX(0)} to={pinX(10)} y={MIDDLE} />
      ) : (
        <GaugeOverlay method={method} pinX={pinX} y={MIDDLE} />
      )}
    </Drawing>
  );
}
