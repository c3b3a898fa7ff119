import { LEVELS } from '../types';
import { crpsObjective, Lesson } from './crps-loss';
import { designRow, scaleLength } from './design';
import { minimise } from './lbfgs';
import type { Outcome } from './lessons';
import type { Coefficients } from './model';

/** What the coefficients are drawn to, and the share that this fleet's own riders have in the answer. */
export interface Prior {
  prior: Coefficients;
  own: number;
}

type Standard = Pick<Coefficients, 'mean' | 'sd'>;

const RIDGE = { location: 0.03, scale: 0.1 };
/** Intercept and z are free in a fit of its own, and held this weakly beside a prior. */
const FREE_WITH_PRIOR = 0.03;
/** Long logs weigh more, but less than by their length. */
const LENGTH_POWER = -0.25;

const round = (v: number) => Math.round(1e5 * v) / 1e5;

/** Coefficients with the least CRPS over the outcomes, in at most so many steps of L-BFGS, with a pause after each. */
export function* fitCoefficients(
  outcomes: readonly Outcome[],
  iterations: number,
  shrink: Prior | undefined,
): Generator<void, Coefficients> {
  const standard = shrink?.prior ?? standardise(outcomes);
  const lessons = toLessons(outcomes, standard);
  const scaleSize = scaleLength(standard.mean.length);
  const size = lessons[0]!.row.length;
  const zAt = size + scaleSize - 1;
  const centre = new Float64Array(zAt + LEVELS.length);
  const pull = shrink ? 1 / Math.max(shrink.own, 0.01) ** 2 : 1;
  const free = shrink ? FREE_WITH_PRIOR * pull : 0;
  const strength = centre.map((_, i) => {
    if (i === 0 || i >= zAt) return free;
    return pull * (i < size ? RIDGE.location : RIDGE.scale);
  });
  if (shrink) centre.set([...shrink.prior.location, ...shrink.prior.scale.slice(1), ...shrink.prior.z]);
  const start = shrink ? centre : freshStart(lessons, centre.length, zAt);
  const x = yield* minimise(crpsObjective(lessons, scaleSize, { centre, strength }), start, iterations);
  return {
    mean: standard.mean,
    sd: standard.sd,
    location: Array.from(x.subarray(0, size), round),
    scale: [0, ...Array.from(x.subarray(size, zAt), round)],
    z: Array.from(x.subarray(zAt), round).sort((a, b) => a - b),
    spread: 1,
  };
}

function freshStart(lessons: readonly Lesson[], length: number, zAt: number): Float64Array {
  const start = new Float64Array(length);
  const logDays = lessons.map(({ days }) => Math.log(days)).sort((a, b) => a - b);
  start[0] = logDays[logDays.length >> 1]!;
  LEVELS.forEach((level, l) => (start[zAt + l] = 1.2 * (level - 0.5)));
  return start;
}

function standardise(outcomes: readonly Outcome[]): Standard {
  const n = outcomes[0]!.features.length;
  const mean = new Array<number>(n).fill(0);
  const square = new Array<number>(n).fill(0);
  for (const { features } of outcomes) {
    features.forEach((value, i) => {
      mean[i]! += value / outcomes.length;
      square[i]! += value ** 2 / outcomes.length;
    });
  }
  return {
    mean: mean.map(round),
    sd: square.map((s, i) => round(Math.sqrt(Math.max(s - mean[i]! ** 2, 0)) + 1e-5)),
  };
}

function toLessons(outcomes: readonly Outcome[], standard: Standard): Lesson[] {
  const ofRider = new Map<number, number>();
  const ofKm = new Map<number, [days: number, count: number]>();
  for (const { rider, km, days } of outcomes) {
    ofRider.set(rider, (ofRider.get(rider) ?? 0) + 1);
    const [sum, count] = ofKm.get(km) ?? [0, 0];
    ofKm.set(km, [sum + days, count + 1]);
  }
  return outcomes.map(({ rider, features, km, days, horizon }) => {
    const [sum, count] = ofKm.get(km)!;
    const weight = ofRider.get(rider)! ** LENGTH_POWER * ((100 * count) / sum);
    return { row: designRow(features, km, standard), days, horizon, weight };
  });
}
