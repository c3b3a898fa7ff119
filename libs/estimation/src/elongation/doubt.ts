import { carrying, fillRow, Gauge, spreadOf } from './gauge';
import { Grid, nodesOf } from './grid';
import { addAlong } from './reading-table';
import { largest } from '../math/largest';

/** Rates that carry less than this share of the likeliest one's weight say nothing of a reading. */
const LIGHT = 1e-3;

/** Chance that each reading is wrong, by its id, averaged over the posterior of rate, run-in and offset. */
export function doubts(grid: Grid, gauges: readonly Gauge[]): Map<string, number> {
  const chances = new Map<string, number>();
  for (const gauge of gauges) doubtsOf(gauge, grid, chances);
  return chances;
}

function doubtsOf(gauge: Gauge, { rate, runIn, log }: Grid, chances: Map<string, number>): void {
  const { nodes, tables, baselines, first } = gauge;
  const rates = nodesOf(rate);
  const runIns = nodesOf(runIn);
  const spread = spreadOf(gauge, runIns);
  const top = largest(log);
  const row = new Float64Array(nodes);
  const along = new Float64Array(nodes);
  const sums = tables.map(() => 0);
  /** Posterior weight by run-in and node, all rates together. */
  const joint = new Float64Array(spread.length);
  let total = 0;
  // Every other rate will do: on an even grid sums of smooth densities stay exact to many digits.
  for (let i = 0; i < rate.nodes; i += 2) {
    const weights = runIns.map((_, j) => Math.exp(log[j * rate.nodes + i]! - top));
    if (Math.max(...weights) < LIGHT) continue;
    fillRow(gauge, rates[i]!, row);
    const [from, to] = carrying(row);
    const perNode = new Float64Array(nodes);
    for (let j = 0; j < runIns.length; j++) {
      let own = 0;
      for (let k = from; k < to; k++) own += row[k]! * spread[j * nodes + k]!;
      const scale = own > 0 ? weights[j]! / own : 0;
      for (let k = from; k < to; k++) {
        const weight = scale * row[k]! * spread[j * nodes + k]!;
        perNode[k]! += weight;
        joint[j * nodes + k]! += weight;
      }
      total += weights[j]!;
    }
    tables.forEach((table, n) => {
      addAlong(table, table.wrong, first + (rates[i]! * table.reading.wearKm) / 1000, along.fill(0));
      sums[n]! += dot(perNode, along);
    });
  }
  tables.forEach(({ reading }, n) => chances.set(reading.id, sums[n]! / total));
  for (const table of baselines) {
    let sum = 0;
    runIns.forEach((start, j) => {
      addAlong(table, table.wrong, first - start, along.fill(0));
      sum += dot(joint.subarray(j * nodes, (j + 1) * nodes), along);
    });
    chances.set(table.reading.id, sum / total);
  }
}

function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let k = 0; k < a.length; k++) sum += a[k]! * b[k]!;
  return sum;
}
