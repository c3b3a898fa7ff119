import type { ReadingMethod } from '@halfpitch/contracts';
import { Random } from './random';

interface Gauge {
  /** How often the workshop takes it. */
  share: number;
  offset: number;
  offsetSd: number;
  noiseSd: number;
  /** What its scale can be read to, %. */
  step: number;
}

/** Offsets and noise as the estimation assumes them (% elongation); scales are common practice, no source. */
export const GAUGES: Record<ReadingMethod, Gauge> = {
  'steel-rule': { share: 0.12, offset: 0, offsetSd: 0.02, noiseSd: 0.06, step: 0.05 },
  'three-point': { share: 0.25, offset: 0, offsetSd: 0.03, noiseSd: 0.04, step: 0.05 },
  'two-point': { share: 0.13, offset: 0.12, offsetSd: 0.08, noiseSd: 0.05, step: 0.05 },
  digital: { share: 0.28, offset: 0, offsetSd: 0.02, noiseSd: 0.02, step: 0.01 },
  'drop-in': { share: 0.22, offset: 0.12, offsetSd: 0.08, noiseSd: 0.05, step: 0 },
};

/** Steps of a drop-in gauge, %. */
const STEPS = [0.5, 0.75, 1];

export interface Shown {
  valuesPct: number[] | null;
  lowerPct: number | null;
  upperPct: number | null;
}

export function pickGauge(random: Random): ReadingMethod {
  const shares = Object.entries(GAUGES).map(([method, { share }]) => [method, share] as const);
  return random.weighted<ReadingMethod>(Object.fromEntries(shares));
}

/** What a gauge with this offset shows on a chain of this true elongation, %. */
export function measure(random: Random, method: ReadingMethod, truePct: number, offsetPct: number): Shown {
  const { noiseSd, step } = GAUGES[method];
  const once = () => truePct + offsetPct + noiseSd * random.normal();
  if (method === 'drop-in') {
    const at = once();
    const goes = STEPS.filter((s) => s <= at);
    return { valuesPct: null, lowerPct: goes.at(-1) ?? null, upperPct: STEPS[goes.length] ?? null };
  }
  const places = random.pick([1, 3, 3, 5]);
  const round = (value: number) => Math.max(Math.round(Math.round(value / step) * step * 100) / 100, -0.3);
  return { valuesPct: Array.from({ length: places }, () => round(once())), lowerPct: null, upperPct: null };
}

/** The elongation a mechanic goes by, %: the worst place, or the step that went in. */
export const worst = ({ valuesPct, lowerPct }: Shown): number =>
  valuesPct ? Math.max(...valuesPct) : (lowerPct ?? 0);
