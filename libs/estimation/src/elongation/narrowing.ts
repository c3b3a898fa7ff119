import { weightedBand } from '../math/weighted';
import type { ChainEstimate, ReadingMethod } from '../types';
import { methodErrors } from './methods';
import { ElongationPosterior, elongationPosterior, PlacedReading, RatePrior } from './posterior';

const METHOD: ReadingMethod = 'three-point';

/** By how much a reading with a three-point gauge today would shrink the window of wear km left, if it is worth taking. */
export function narrowing(
  readings: readonly PlacedReading[],
  prior: RatePrior,
  posterior: ElongationPosterior,
  wearKm: number,
  limitPct: number,
): ChainEstimate['narrows'] {
  const width = (of: ElongationPosterior) => {
    const left = of.wearKmLeft(wearKm, limitPct);
    const { p10, p90 } = weightedBand(left.values, left.weights);
    return p90 - p10;
  };
  const value = posterior.elongationAt(wearKm).p50 + methodErrors[METHOD].offset;
  const extra: PlacedReading = {
    id: 'supposed',
    day: 0,
    method: METHOD,
    gauge: 'supposed',
    values: [value],
    wearKm,
  };
  const factor = width(elongationPosterior([...readings, extra], prior)) / width(posterior);
  return Number.isFinite(factor) && factor < 0.8 ? { method: METHOD, factor } : null;
}
