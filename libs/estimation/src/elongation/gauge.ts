import { ElongationModel, PlacedReading } from './model';
import type { MethodError } from './methods';
import { addAlong, ReadingTable, readingTable } from './reading-table';

const REACH = 5;
const MOST_NODES = 401;

/**
 * One gauge's readings on one chain, made ready to be asked many times. All that they tell of run-in and offset is their
 * sum, so what they say at one rate is worked out once, on nodes over that sum, whatever the run-in.
 */
export interface Gauge {
  errors: MethodError;
  /** Sum of run-in and offset at the first node, %, the nodes' distance and their number. */
  first: number;
  step: number;
  nodes: number;
  /** Readings of a chain that has run. */
  tables: readonly ReadingTable[];
  /** Readings of the chain when new: they show the offset alone. */
  baselines: readonly ReadingTable[];
}

/**
 * Lays the nodes: evenly over five prior sd of the offset either way and the run-ins besides, less than one sd apart of
 * what the readings leave of the offset. The trapezoidal rule on such a grid is exact to many digits for integrands that
 * are nearly Gaussian.
 */
export function gaugeOf(
  readings: readonly PlacedReading[],
  model: ElongationModel,
  mostRunIn: number,
): Gauge {
  const errors = model.methods[readings[0]!.method];
  const { offset, offsetSd, noiseSd } = errors;
  const left = 1 / Math.sqrt(1 / offsetSd ** 2 + readings.length / noiseSd ** 2);
  const span = 2 * REACH * offsetSd + mostRunIn;
  const nodes = Math.min(Math.ceil(span / Math.min(0.9 * left, 0.5 * offsetSd)) + 1, MOST_NODES);
  const step = span / (nodes - 1);
  const all = readings.map((reading) => readingTable(reading, step, model));
  return {
    errors,
    first: offset - REACH * offsetSd,
    step,
    nodes,
    tables: all.filter(({ reading }) => !reading.baseline),
    baselines: all.filter(({ reading }) => reading.baseline),
  };
}

/**
 * Fills `row` with the likelihood of the gauge's readings at `rate` (% per 1,000 wear km) on its nodes, the largest
 * being 1, and returns the log of the factor taken out.
 */
export function fillRow({ tables, first }: Gauge, rate: number, row: Float64Array): number {
  row.fill(0);
  for (const table of tables) addAlong(table, table.log, first + (rate * table.reading.wearKm) / 1000, row);
  return exponentiate(row);
}

/** The nodes from..to (`to` left out) outside which a row of likelihoods carries nothing. */
export function carrying(row: Float64Array): readonly [from: number, to: number] {
  let from = 0;
  let to = row.length;
  while (from < to && row[from] === 0) from++;
  while (to > from && row[to - 1] === 0) to--;
  return [from, to];
}

/** spread[j · nodes + k] = density of node k when run-in is the j-th, baseline readings counted in, times the step. */
export function spreadOf(
  { errors, first, step, nodes, baselines }: Gauge,
  runIns: Float64Array,
): Float64Array {
  const spread = new Float64Array(runIns.length * nodes);
  for (let j = 0; j < runIns.length; j++) {
    const row = spread.subarray(j * nodes, (j + 1) * nodes);
    const start = first - runIns[j]!;
    for (let k = 0; k < nodes; k++) {
      const z = (start + k * step - errors.offset) / errors.offsetSd;
      row[k] = -0.5 * z * z;
    }
    for (const table of baselines) addAlong(table, table.log, start, row);
  }
  exponentiate(spread);
  return spread;
}

function exponentiate(logs: Float64Array): number {
  let top = -Infinity;
  for (let k = 0; k < logs.length; k++) if (logs[k]! > top) top = logs[k]!;
  for (let k = 0; k < logs.length; k++) logs[k] = logs[k]! > top - 45 ? Math.exp(logs[k]! - top) : 0;
  return top;
}
