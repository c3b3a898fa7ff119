import { tabledCdf } from '../math/normal-table';
import { robust } from './rider-life';

/** One observation of a rider: log bounds of the life, and the place of its kind among the parameters. */
export interface SeenLife {
  kind: number;
  logLow: number;
  logHigh: number;
  /** Weight of the look being mistaken. */
  mistaken: number;
}

/** Log medians by kind, then log sd within and between riders. */
export type LifeParameters = Float64Array;

// Taken once: looked up in the innermost loop they would cost more than they do.
const { exp, log: ln, max } = Math;
const ENDLESS = Infinity;
const ROOT_2PI = Math.sqrt(2 * Math.PI);

const REACH = 4.2;
const LEAST_CHANCE = 1e-12;

/** Nodes for a rider's effect, close enough for what so many observations can tell of it. */
function nodeCount(observations: number, within: number, between: number): number {
  const sd = 1 / Math.sqrt(1 + observations * (between / within) ** 2);
  return Math.min(Math.ceil((2 * REACH) / (1.1 * sd)) + 1, 101);
}

/**
 * Log-likelihood of one rider's observations with the rider's normal effect summed out by the trapezoidal rule; adds its
 * derivatives by the parameters to `gradient`.
 */
export function riderLogLikelihood(
  seen: readonly SeenLife[],
  parameters: LifeParameters,
  gradient: Float64Array,
): number {
  const kinds = parameters.length - 2;
  const within = Math.exp(parameters[kinds]!);
  const between = Math.exp(parameters[kinds + 1]!);
  const nodes = nodeCount(seen.length, within, between);
  const step = (2 * REACH) / (nodes - 1);
  const logs = new Float64Array(nodes);
  const slopes = new Float64Array(nodes * parameters.length);
  let top = -ENDLESS;
  for (let n = 0; n < nodes; n++) {
    const z = -REACH + n * step;
    const row = n * parameters.length;
    let log = -0.5 * z * z;
    for (const { kind, logLow, logHigh, mistaken } of seen) {
      const mean = parameters[kind]! + between * z;
      const from = (logLow - mean) / within;
      const to = (logHigh - mean) / within;
      const chance = max(robust(tabledCdf(to) - tabledCdf(from), mistaken), LEAST_CHANCE);
      const soundness = robust(1, 0) / chance;
      const low = from > -ENDLESS ? exp(-0.5 * from * from) / ROOT_2PI : 0;
      const high = to < ENDLESS ? exp(-0.5 * to * to) / ROOT_2PI : 0;
      log += ln(chance);
      const byMean = ((low - high) / within) * soundness;
      slopes[row + kind]! += byMean;
      slopes[row + kinds]! += ((low && from * low) - (high && to * high)) * soundness;
      slopes[row + kinds + 1]! += byMean * between * z;
    }
    logs[n] = log;
    if (log > top) top = log;
  }
  let total = 0;
  for (let n = 0; n < nodes; n++) total += logs[n] = exp(logs[n]! - top);
  for (let n = 0; n < nodes; n++) {
    for (let i = 0; i < parameters.length; i++)
      gradient[i]! += (logs[n]! / total) * slopes[n * parameters.length + i]!;
  }
  return top + Math.log((total * step) / ROOT_2PI);
}
