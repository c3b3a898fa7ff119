import type { Grid } from './grid';
import { largest } from '../math/largest';

/** Sums over every other node may differ by this share of the whole. */
const ALLOWED = 1e-3;
/** Neighbouring run-ins may put the log rate this many of its standard deviations apart. */
const APART = 1.2;

/**
 * Whether a grid is too coarse, by rates or by run-ins. By rates: the sums over even and over odd nodes differ. By
 * run-ins: likewise, or the bells over log rate of neighbouring run-ins stand so far apart that their sum would ripple.
 */
export function unsettled({ rate, runIn, log }: Grid): { rates: boolean; runIns: boolean } {
  const top = largest(log);
  let [total, columns, rows] = [0, 0, 0];
  let ripples = 0;
  let before = { sum: 0, mean: 0, sd: 0 };
  for (let k = 0; k < runIn.nodes; k++) {
    const row = rowMoments(log.subarray(k * rate.nodes, (k + 1) * rate.nodes), top);
    total += row.sum;
    columns += Math.abs(row.alternating);
    rows += k % 2 === 0 ? row.sum : -row.sum;
    const apart = Math.abs(row.mean - before.mean) / Math.max(Math.min(row.sd, before.sd), 0.3);
    if (k > 0 && apart > APART) ripples += Math.min(row.sum, before.sum);
    before = row;
  }
  return {
    rates: columns > ALLOWED * total,
    runIns: Math.abs(rows) > ALLOWED * total || ripples > 0.05 * total,
  };
}

/** Sum, alternating sum, mean and sd of one row, the last two in nodes. */
function rowMoments(log: Float64Array, top: number) {
  let [sum, alternating, first, second] = [0, 0, 0, 0];
  for (let i = 0; i < log.length; i++) {
    if (log[i]! < top - 36) continue;
    const weight = Math.exp(log[i]! - top);
    sum += weight;
    alternating += i % 2 === 0 ? weight : -weight;
    first += weight * i;
    second += weight * i * i;
  }
  const mean = sum > 0 ? first / sum : 0;
  return { sum, alternating, mean, sd: sum > 0 ? Math.sqrt(Math.max(second / sum - mean * mean, 0)) : 0 };
}
