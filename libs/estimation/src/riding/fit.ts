import { LEVELS } from '../types';
import { blankQuantiles } from './blank';
import { crpsObjective, Lesson } from './crps-loss';
import { defaultRidingModel } from './default-model';
import { designRow, scaleLength } from './design';
import { minimise } from './lbfgs';
import { longOutcomes, newcomerOutcomes, Outcome, outcomesOf, RiderLog, toDailyLogs } from './lessons';
import type { Coefficients, LearnedRiding } from './model';
import { quantilesAt } from './quantiles';
import { fleetSeason } from './season';

const STEP_DAYS = 14;
const ITERATIONS = 120;
const FOLDS = 3;
const FOLD_ITERATIONS = 60;
const PENALTIES = { location: 0.03, scale: 0.1 };
/** Long logs weigh more, but less than by their length. */
const LENGTH_POWER = -0.25;
/** Fewer outcomes than coefficients teach nothing: the shipped model stays. */
const FEWEST_OUTCOMES = 600;
const COVERAGE = 0.8;

/** Learns how riding goes on from riders' logs; deterministic, seconds for some dozens of riders. */
export function fitRidingModel(riders: readonly RiderLog[]): LearnedRiding {
  const logs = toDailyLogs(riders);
  const season = fleetSeason(logs);
  const outcomes = outcomesOf(logs, season, STEP_DAYS);
  const newcomers = newcomerOutcomes(logs, season);
  const long = longOutcomes(logs);
  if (outcomes.length < FEWEST_OUTCOMES || long.length === 0) return defaultRidingModel;
  return {
    version: 'learned-2',
    season,
    ...fitOutcomes(outcomes, ITERATIONS),
    spread: honestSpread(outcomesOf(logs, season, 2 * STEP_DAYS)),
    newcomer: { ...fitOutcomes(newcomers, ITERATIONS), spread: honestSpread(newcomers) },
    blank: blankQuantiles(long),
    riders: logs.length,
    origins: outcomes.length,
  };
}

function fitOutcomes(outcomes: readonly Outcome[], iterations: number): Coefficients {
  const standard = standardise(outcomes);
  const lessons = toLessons(outcomes, standard);
  const scaleSize = scaleLength(standard.mean.length);
  const size = lessons[0]!.row.length;
  const start = new Float64Array(size + scaleSize - 1 + LEVELS.length);
  const logDays = lessons.map(({ days }) => Math.log(days)).sort((a, b) => a - b);
  start[0] = logDays[logDays.length >> 1]!;
  LEVELS.forEach((level, l) => (start[size + scaleSize - 1 + l] = 1.2 * (level - 0.5)));
  const x = minimise(crpsObjective(lessons, scaleSize, PENALTIES), start, iterations);
  const round = (values: Float64Array) => Array.from(values, (v) => Math.round(1e5 * v) / 1e5);
  return {
    ...standard,
    location: round(x.subarray(0, size)),
    scale: [0, ...round(x.subarray(size, size + scaleSize - 1))],
    z: round(x.subarray(size + scaleSize - 1)).sort((a, b) => a - b),
    spread: 1,
  };
}

/** The width at which windows for riders left out of the fit hold as often as they say. */
function honestSpread(outcomes: readonly Outcome[]): number {
  const misses: number[] = [];
  for (let fold = 0; fold < FOLDS; fold++) {
    const taught = outcomes.filter(({ rider }) => rider % FOLDS !== fold);
    const left = outcomes.filter(({ rider }) => rider % FOLDS === fold);
    if (taught.length === 0 || left.length === 0) return 1;
    const model = fitOutcomes(taught, FOLD_ITERATIONS);
    for (const outcome of left) misses.push(neededSpread(outcome, model));
  }
  misses.sort((a, b) => a - b);
  const spread = misses[Math.floor(COVERAGE * misses.length)] ?? 1;
  return Math.min(Math.max(Math.round(1000 * spread) / 1000, 0.5), 2);
}

/** The smallest width factor with which P10 to P90 would have held this outcome. */
function neededSpread({ features, km, days, horizon }: Outcome, model: Coefficients): number {
  const holds = (spread: number) => {
    const q = quantilesAt({ ...model, spread }, features, km);
    return days >= Math.min(q[1]!, horizon) && days <= (q[9]! >= horizon ? horizon : q[9]!);
  };
  for (let spread = 0.3; spread < 3; spread += 0.05) if (holds(spread)) return spread;
  return 3;
}

function standardise(outcomes: readonly Outcome[]): { mean: number[]; sd: number[] } {
  const n = outcomes[0]!.features.length;
  const mean = new Array<number>(n).fill(0);
  const square = new Array<number>(n).fill(0);
  for (const { features } of outcomes) {
    features.forEach((value, i) => {
      mean[i]! += value / outcomes.length;
      square[i]! += value ** 2 / outcomes.length;
    });
  }
  const round = (v: number) => Math.round(1e5 * v) / 1e5;
  return {
    mean: mean.map(round),
    sd: square.map((s, i) => round(Math.sqrt(Math.max(s - mean[i]! ** 2, 0)) + 1e-5)),
  };
}

function toLessons(outcomes: readonly Outcome[], standard: { mean: number[]; sd: number[] }): Lesson[] {
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
