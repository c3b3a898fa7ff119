import type { Grid } from './grid';
import { largest } from '../math/largest';

/** The posterior as, for each run-in, a distribution function over log rate. */
export interface Conditionals {
  /** Run-in of each row, %. */
  runIns: Float64Array;
  /** Mass of the rows up to log rate t: the chance of (run-in = row, log rate <= t). */
  upTo(row: number, logRate: number): number;
  /** Whole mass of each row; they sum to 1. */
  mass: Float64Array;
  /** Log rates between which all mass lies. */
  range: readonly [low: number, high: number];
}

/**
 * Sums a gridded density along log rate: the trapezoidal rule with its end correction, -h²/12 (f'(b) - f'(a)), and
 * between nodes a cubic through sums and densities. The error is of the fourth order in the step.
 */
export function conditionals({ rate, runIn, log }: Grid): Conditionals {
  const n = rate.nodes;
  const h = rate.step;
  const top = largest(log);
  const density = new Float64Array(log.length);
  for (let i = 0; i < log.length; i++) density[i] = Math.exp(log[i]! - top);
  const sums = new Float64Array(density.length);
  const mass = new Float64Array(runIn.nodes);
  for (let k = 0; k < runIn.nodes; k++) {
    const at = (i: number) => density[k * n + Math.min(Math.max(i, 0), n - 1)]!;
    const slope = (i: number) => (at(i + 1) - at(i - 1)) / (2 * h);
    for (let i = 1, sum = 0; i < n; i++) {
      sum += (h / 2) * (at(i - 1) + at(i)) - ((h * h) / 12) * (slope(i) - slope(i - 1));
      sums[k * n + i] = Math.max(sum, sums[k * n + i - 1]!);
    }
    mass[k] = sums[k * n + n - 1]!;
  }
  const total = mass.reduce((sum, x) => sum + x, 0);
  for (let i = 0; i < sums.length; i++) {
    sums[i]! /= total;
    density[i]! *= h / total;
  }
  return {
    runIns: Float64Array.from({ length: runIn.nodes }, (_, k) => Math.exp(runIn.low + k * runIn.step)),
    mass: mass.map((x) => x / total),
    range: [rate.low, rate.low + h * (n - 1)],
    upTo(row, logRate) {
      const place = (logRate - rate.low) / h;
      if (!(place > 0)) return 0;
      if (place >= n - 1) return sums[row * n + n - 1]!;
      const i = Math.floor(place);
      return cubic(sums, density, row * n + i, place - i);
    },
  };
}

/** Cubic between two neighbouring sums whose slopes are the densities, in steps; never outside the two sums. */
function cubic(sums: Float64Array, density: Float64Array, i: number, t: number): number {
  const a = sums[i]!;
  const b = sums[i + 1]!;
  const u = 1 - t;
  const value =
    u * u * (1 + 2 * t) * a + t * t * (3 - 2 * t) * b + t * u * (u * density[i]! - t * density[i + 1]!);
  return Math.min(Math.max(value, a), b);
}
