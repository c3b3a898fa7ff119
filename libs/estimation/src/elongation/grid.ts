import { carrying, fillRow, Gauge, spreadOf } from './gauge';
import type { RatePrior, RunInPrior } from './priors';
import { largest } from '../math/largest';
import { unsettled } from './settled';

/** An even grid over an interval. */
export interface Axis {
  low: number;
  step: number;
  nodes: number;
}

/** Unnormalised log-posterior over log rate (columns) and log run-in (rows). */
export interface Grid {
  rate: Axis;
  runIn: Axis;
  log: Float64Array;
}

/** Prior sd of the log run-in that are looked at, either way. */
export const RUN_IN_REACH = 4.5;
const RATE_REACH = 6;
/** A node this far below the top in the log carries nothing that shows. */
const NEGLIGIBLE = 18;
const FIRST = { rate: 49, runIn: 9 };
const SEARCH = { rate: 21, runIn: 7 };
const LAST = { rate: 43, runIn: 15 };
/** A search ends once the mass takes this many of its steps: the last grid then lies tight enough. */
const RESOLVED = { rate: 12, runIn: 4 };
const MOST_ROWS = 97;

const axis = (low: number, high: number, nodes: number): Axis => ({
  low,
  step: (high - low) / (nodes - 1),
  nodes,
});

export const nodesOf = ({ low, step, nodes }: Axis): Float64Array =>
  Float64Array.from({ length: nodes }, (_, i) => Math.exp(low + i * step));

/**
 * Posterior of a chain's rate and run-in on a grid laid where it has its mass: starts six prior sd either way and closes
 * in until the mass fills the grid.
 */
export function posteriorGrid(gauges: readonly Gauge[], rate: RatePrior, runIn: RunInPrior): Grid {
  const at = { rate: Math.log(rate.median), runIn: Math.log(runIn.median) };
  let box: Box = {
    rate: [at.rate - RATE_REACH * rate.logSd, at.rate + RATE_REACH * rate.logSd],
    runIn: [at.runIn - RUN_IN_REACH * runIn.logSd, at.runIn + RUN_IN_REACH * runIn.logSd],
  };
  const on = ({ rate: rates, runIn: runIns }: Box, nodes: typeof FIRST) =>
    evaluate(gauges, rate, runIn, axis(...rates, nodes.rate), axis(...runIns, nodes.runIn));
  for (let round = 0, nodes = FIRST; round < 6 && gauges.length > 0; round++, nodes = SEARCH) {
    const found = massOf(on(box, nodes));
    const resolved =
      share(found.rate, box.rate) * (nodes.rate - 1) >= RESOLVED.rate &&
      share(found.runIn, box.runIn) * (nodes.runIn - 1) >= RESOLVED.runIn;
    box = found;
    if (resolved) break;
  }
  return refined((nodes) => on(box, nodes), LAST);
}

/** Makes the last grid closer until its sums have settled. */
function refined(on: (nodes: typeof FIRST) => Grid, start: typeof FIRST): Grid {
  let nodes = start;
  let grid = on(nodes);
  for (let round = 0; round < 4; round++) {
    const { rates, runIns } = unsettled(grid);
    if (!rates && !runIns) break;
    nodes = {
      rate: rates ? 2 * nodes.rate - 1 : nodes.rate,
      runIn: runIns ? Math.min(2 * nodes.runIn - 1, MOST_ROWS) : nodes.runIn,
    };
    grid = on(nodes);
  }
  return grid;
}

type Interval = readonly [low: number, high: number];
interface Box {
  rate: Interval;
  runIn: Interval;
}
const share = (inner: Interval, outer: Interval) => (inner[1] - inner[0]) / (outer[1] - outer[0]);

/** Log of prior times likelihood at every node. */
function evaluate(
  gauges: readonly Gauge[],
  ratePrior: RatePrior,
  runInPrior: RunInPrior,
  rate: Axis,
  runIn: Axis,
): Grid {
  const log = logLikelihood(gauges, nodesOf(rate), nodesOf(runIn));
  for (let k = 0, n = 0; k < runIn.nodes; k++) {
    const a = (runIn.low + k * runIn.step - Math.log(runInPrior.median)) / runInPrior.logSd;
    for (let i = 0; i < rate.nodes; i++, n++) {
      const b = (rate.low + i * rate.step - Math.log(ratePrior.median)) / ratePrior.logSd;
      log[n]! -= 0.5 * (a * a + b * b);
    }
  }
  return { rate, runIn, log };
}

/** Log-likelihood of all readings at every rate (columns) and run-in (rows), the offsets integrated out. */
export function logLikelihood(
  gauges: readonly Gauge[],
  rates: Float64Array,
  runIns: Float64Array,
): Float64Array {
  const log = new Float64Array(rates.length * runIns.length);
  for (const gauge of gauges) {
    const spread = spreadOf(gauge, runIns);
    const row = new Float64Array(gauge.nodes);
    for (let i = 0; i < rates.length; i++) {
      const scale = fillRow(gauge, rates[i]!, row);
      const [from, to] = carrying(row);
      for (let j = 0; j < runIns.length; j++) {
        let sum = 0;
        for (let k = from, s = j * gauge.nodes + from; k < to; k++, s++) sum += row[k]! * spread[s]!;
        log[j * rates.length + i]! += scale + Math.log(Math.max(sum, 1e-300));
      }
    }
  }
  return log;
}

/** The box around all nodes that carry mass, one step wider each way where the grid goes on. */
function massOf({ rate, runIn, log }: Grid): Box {
  const top = largest(log);
  const seen = { rate: [rate.nodes, -1], runIn: [runIn.nodes, -1] };
  for (let n = 0; n < log.length; n++) {
    if (log[n]! < top - NEGLIGIBLE) continue;
    const i = n % rate.nodes;
    const k = (n - i) / rate.nodes;
    if (i < seen.rate[0]!) seen.rate[0] = i;
    if (i > seen.rate[1]!) seen.rate[1] = i;
    if (k < seen.runIn[0]!) seen.runIn[0] = k;
    if (k > seen.runIn[1]!) seen.runIn[1] = k;
  }
  const interval = ({ low, step, nodes }: Axis, [first, last]: number[]): Interval => [
    low + step * Math.max(first! - 1, 0),
    low + step * Math.min(last! + 1, nodes - 1),
  ];
  return { rate: interval(rate, seen.rate), runIn: interval(runIn, seen.runIn) };
}
