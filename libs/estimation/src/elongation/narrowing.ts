import type { ReadingMethod } from '../types';
import { defaultElongationModel, ElongationModel } from './model';
import type { ElongationPosterior } from './posterior';
import { largest } from '../math/largest';

const WORTH_TAKING = 0.85;

/**
 * The reading that would narrow the window of wear km left most, and to which share of its width: each method is
 * judged by how the log of the wear km at the limit hangs together with today's elongation under the posterior, as a
 * linear regression would use a reading with that method's offset and noise. `methods` are those at hand.
 */
export function narrowing(
  { grid }: ElongationPosterior,
  wearKm: number,
  limitPct: number,
  methods: readonly ReadingMethod[] = ['three-point'],
  model: ElongationModel = defaultElongationModel,
): { method: ReadingMethod; factor: number } | null {
  const moments = momentsOf(grid, wearKm, limitPct);
  if (moments === null) return null;
  const { elongationVariance, together } = moments;
  let best: { method: ReadingMethod; factor: number } | null = null;
  for (const method of methods) {
    const { offsetSd, noiseSd } = model.methods[method];
    const heard = elongationVariance / (elongationVariance + offsetSd ** 2 + noiseSd ** 2);
    const factor = Math.sqrt(Math.max(1 - together * heard, 0));
    if (factor < WORTH_TAKING && factor < (best?.factor ?? 1)) best = { method, factor };
  }
  return best;
}

/** Variance of today's elongation, and its squared correlation with the log of the wear km at the limit. */
function momentsOf({ rate, runIn, log }: ElongationPosterior['grid'], wearKm: number, limitPct: number) {
  const top = largest(log);
  let [w, e, ee, y, yy, ey] = [0, 0, 0, 0, 0, 0];
  for (let n = 0; n < log.length; n++) {
    const i = n % rate.nodes;
    const start = Math.exp(runIn.low + ((n - i) / rate.nodes) * runIn.step);
    const logRate = rate.low + i * rate.step;
    const weight = Math.exp(log[n]! - top);
    const now = start + (Math.exp(logRate) * wearKm) / 1000;
    const kmAtLimit = Math.log(Math.max(limitPct - start, 1e-3)) - logRate;
    w += weight;
    e += weight * now;
    ee += weight * now * now;
    y += weight * kmAtLimit;
    yy += weight * kmAtLimit * kmAtLimit;
    ey += weight * now * kmAtLimit;
  }
  const elongationVariance = ee / w - (e / w) ** 2;
  const limitVariance = yy / w - (y / w) ** 2;
  if (!(elongationVariance > 1e-12) || !(limitVariance > 1e-12)) return null;
  const covariance = ey / w - (e / w) * (y / w);
  return {
    elongationVariance,
    together: Math.min(covariance ** 2 / (elongationVariance * limitVariance), 1),
  };
}
