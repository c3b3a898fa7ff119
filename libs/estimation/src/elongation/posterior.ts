import { risingRoot } from '../math/solve';
import type { Band } from '../types';
import { checkReadings } from './check-readings';
import { Conditionals, conditionals } from './conditional';
import { Gauge, gaugeOf } from './gauge';
import { Grid, posteriorGrid, RUN_IN_REACH } from './grid';
import { byGauge, defaultElongationModel, ElongationModel, PlacedReading } from './model';
import type { RatePrior } from './priors';

/** What is known of a chain's wear: the posterior of its rate and run-in, and what follows from it. */
export interface ElongationPosterior {
  grid: Grid;
  gauges: readonly Gauge[];
  /** % per 1,000 wear km. */
  rate: Band;
  /** True elongation at wear km x, %. */
  elongationAt(wearKm: number): Band;
  /** Quantile of the wear km from `wearKm` on until the limit; negative when it is past. */
  wearKmLeft(wearKm: number, limitPct: number, p: number): number;
  /** Chance that the limit is past at `wearKm`. */
  chancePast(wearKm: number, limitPct: number): number;
}

/** Rates are found to this share of themselves. */
const TOLERANCE = 5e-5;
/** Rows with less mass are passed over. */
const NOTHING = 1e-7;

/**
 * Posterior of e(x) = run-in + rate · x/1000 given readings by any method. A gauge's readings share its offset, which is
 * integrated out; each reading may be wrong with a small chance, so that one that contradicts the others weighs less.
 * Deterministic quadrature throughout. @throws ImpossibleInputError
 */
export function elongationPosterior(
  readings: readonly PlacedReading[],
  prior: RatePrior,
  model: ElongationModel = defaultElongationModel,
): ElongationPosterior {
  checkReadings(readings, prior);
  const mostRunIn = model.runIn.median * Math.exp(RUN_IN_REACH * model.runIn.logSd);
  const gauges = byGauge(readings).map((group) => gaugeOf(group, model, mostRunIn));
  const grid = posteriorGrid(gauges, prior, model.runIn);
  const rows = conditionals(grid);
  const rate = (p: number) =>
    Math.exp(risingRoot((t) => chance(rows, () => t) - p, ...rows.range, TOLERANCE));
  const past = (totalKm: number, limitPct: number) =>
    1 - chance(rows, (k) => logRateTo(limitPct - rows.runIns[k]!, totalKm));
  let asked = roomTo(rows, NaN);
  const room = (limitPct: number) => (asked.limitPct === limitPct ? asked : (asked = roomTo(rows, limitPct)));
  return {
    grid,
    gauges,
    rate: band(rate),
    elongationAt: (wearKm) => band((p) => elongation(rows, Math.max(wearKm, 0), p)),
    wearKmLeft: (wearKm, limitPct, p) => kmAtLimit(rows, room(limitPct), p) - wearKm,
    chancePast: past,
  };
}

const band = (at: (p: number) => number): Band => ({ p10: at(0.1), p50: at(0.5), p90: at(0.9) });

/** Log of the rate that lengthens a chain by `pct` in `km`; below every rate when nothing is left to lengthen. */
const logRateTo = (pct: number, km: number): number =>
  pct <= 0 ? -Infinity : km <= 0 ? Infinity : Math.log((1000 * pct) / km);

/** Chance that the log rate is at most a bound that depends on the run-in. */
function chance(rows: Conditionals, bound: (row: number) => number): number {
  let sum = 0;
  for (let k = 0; k < rows.runIns.length; k++) if (rows.mass[k]! > NOTHING) sum += rows.upTo(k, bound(k));
  return sum;
}

function elongation(rows: Conditionals, wearKm: number, p: number): number {
  const first = rows.runIns[0]!;
  const last = rows.runIns[rows.runIns.length - 1]!;
  const low = first + (Math.exp(rows.range[0]) * wearKm) / 1000;
  const high = last + (Math.exp(rows.range[1]) * wearKm) / 1000;
  if (wearKm <= 0) return runInQuantile(rows, p);
  const logs = [Math.log(low), Math.log(high)] as const;
  const upTo = (log: number) => {
    const most = Math.exp(log);
    return chance(rows, (k) => logRateTo(most - rows.runIns[k]!, wearKm));
  };
  return Math.exp(risingRoot((log) => upTo(log) - p, ...logs, TOLERANCE));
}

/** Quantile of the run-in alone: each row's mass lies half a step either side of it on the log scale. */
function runInQuantile({ runIns, mass }: Conditionals, p: number): number {
  const stride = runIns[1]! / runIns[0]!;
  let below = 0;
  let k = 0;
  while (k < runIns.length - 1 && below + mass[k]! < p) below += mass[k++]!;
  const share = mass[k]! > 0 ? Math.min((p - below) / mass[k]!, 1) : 0.5;
  return runIns[k]! * stride ** (share - 0.5);
}

/** What each run-in leaves up to a limit, as the log rate that takes it in one km, and the logs of km it can take. */
interface Room {
  limitPct: number;
  logs: Float64Array;
  low: number;
  high: number;
}

function roomTo(rows: Conditionals, limitPct: number): Room {
  const [slowest, fastest] = rows.range;
  const logs = rows.runIns.map((runIn) => logRateTo(limitPct - runIn, 1));
  const heavy = logs.filter((log, k) => rows.mass[k]! > NOTHING && log > -Infinity);
  return { limitPct, logs, low: Math.min(...heavy) - fastest, high: Math.max(...heavy) - slowest };
}

/** Quantile of the wear km from new to the limit; 0 where the run-in alone takes it there. */
function kmAtLimit(rows: Conditionals, { logs, low, high }: Room, p: number): number {
  const above = (log: number) => 1 - chance(rows, (k) => logs[k]! - log) - p;
  if (!(low < high) || above(low) >= 0) return 0;
  return Math.exp(risingRoot(above, low, high, TOLERANCE));
}
