import { blankQuantiles } from './blank';
import { fitCoefficients } from './coefficients';
import { defaultRidingModel } from './default-model';
import { honestSpread } from './honest-spread';
import { longOutcomes, newcomerOutcomes, Outcome, outcomesOf, RiderLog, toDailyLogs } from './lessons';
import type { DailyLog } from './daily-log';
import type { Coefficients, LearnedRiding } from './model';
import { fleetSeason } from './season';

const STEP_DAYS = 14;
const ITERATIONS = 120;

/**
 * Learns how riding goes on from riders' logs; deterministic, seconds for some dozens of riders. With `shipped` (as in the
 * product) the coefficients are drawn to it, the more the fewer riders there are; null learns from these riders alone.
 */
export function fitRidingModel(
  riders: readonly RiderLog[],
  shipped: LearnedRiding | null = defaultRidingModel,
): LearnedRiding {
  const steps = fitRidingInSteps(riders, shipped);
  let step = steps.next();
  while (!step.done) step = steps.next();
  return step.value;
}

/** The same, pausing every few hundredths of a second, so that a server can answer in between. */
export function* fitRidingInSteps(
  riders: readonly RiderLog[],
  shipped: LearnedRiding | null = defaultRidingModel,
): Generator<void, LearnedRiding> {
  const logs = toDailyLogs(riders);
  const own = shipped ? logs.length / (logs.length + shipped.riders) : 1;
  const mix = (ours: readonly number[], theirs: readonly number[] | undefined) =>
    ours.map((v, i) => Math.round(1e4 * (own * v + (1 - own) * (theirs?.[i] ?? v))) / 1e4);
  const season = mix(fleetSeason(logs), shipped?.season);
  const outcomes = yield* byRider(logs, (log, rider) => outcomesOf(log, rider, season, STEP_DAYS));
  const newcomers = yield* byRider(logs, (log, rider) => newcomerOutcomes(log, rider, season));
  const long = yield* byRider(logs, longOutcomes);
  const start = shipped ?? defaultRidingModel;
  if (Math.min(outcomes.length, newcomers.length) === 0) return start;
  function* learn(taught: readonly Outcome[], prior: Coefficients | undefined) {
    const coefficients = yield* fitCoefficients(taught, ITERATIONS, prior && { prior, own });
    const spread = yield* honestSpread(taught, prior && { prior, own });
    return { ...coefficients, spread: mix([spread], prior && [prior.spread])[0]! };
  }
  return {
    version: 'learned-2',
    season,
    ...(yield* learn(outcomes, shipped ?? undefined)),
    newcomer: yield* learn(newcomers, shipped?.newcomer),
    // Two years' outcomes need logs longer than that.
    blank:
      long.length === 0 ? start.blank : blankQuantiles(long).map((row, i) => mix(row, shipped?.blank[i])),
    riders: logs.length,
    origins: outcomes.length,
  };
}

/** What each log shows, with a pause after each. */
function* byRider(
  logs: readonly DailyLog[],
  shown: (log: DailyLog, rider: number) => Outcome[],
): Generator<void, Outcome[]> {
  const all: Outcome[][] = [];
  for (const [rider, log] of logs.entries()) {
    all.push(shown(log, rider));
    yield;
  }
  return all.flat();
}
