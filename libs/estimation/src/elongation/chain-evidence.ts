import type { ElongationModel, PlacedReading } from './model';
import { elongationPosterior } from './posterior';
import type { RatePrior } from './priors';

/** What one chain's readings say of its log rate, on nodes laid where they say it. */
export interface ChainEvidence {
  logRates: Float64Array;
  /** Log-likelihood at the nodes, the run-in and the offsets integrated out, up to a constant. */
  log: Float64Array;
}

/** Prior sd under which the nodes are laid: wide, so that they still lie right under what the fleet teaches. */
const OPEN_SD = 0.9;

/** A chain's evidence, free of any prior of the rate: its posterior under an open prior, divided by that prior. */
export function chainEvidence(
  readings: readonly PlacedReading[],
  { median }: RatePrior,
  model: ElongationModel,
): ChainEvidence {
  const { rate, runIn, log } = elongationPosterior(readings, { median, logSd: OPEN_SD }, model).grid;
  const logRates = Float64Array.from({ length: rate.nodes }, (_, i) => rate.low + i * rate.step);
  const top = log.reduce((most, x) => Math.max(most, x), -Infinity);
  const evidence = logRates.map((logRate, i) => {
    let sum = 0;
    for (let k = 0; k < runIn.nodes; k++) sum += Math.exp(log[k * rate.nodes + i]! - top);
    const z = (logRate - Math.log(median)) / OPEN_SD;
    return Math.log(Math.max(sum, 1e-300)) + 0.5 * z * z;
  });
  return { logRates, log: evidence };
}

/** Mean and mean square distance from `mean` of a chain's log rate, when the fleet's are normal about `mean`. */
export function momentsUnder(
  { logRates, log }: ChainEvidence,
  mean: number,
  sd: number,
): { mean: number; square: number } {
  const weights = log.map((value, i) => value - 0.5 * ((logRates[i]! - mean) / sd) ** 2);
  const top = weights.reduce((most, x) => Math.max(most, x), -Infinity);
  let [total, first, second] = [0, 0, 0];
  for (let i = 0; i < weights.length; i++) {
    const weight = Math.exp(weights[i]! - top);
    const distance = logRates[i]! - mean;
    total += weight;
    first += weight * distance;
    second += weight * distance * distance;
  }
  return { mean: mean + first / total, square: second / total };
}
