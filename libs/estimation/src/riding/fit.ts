import { blankQuantiles } from './blank';
import { fitCoefficients } from './coefficients';
import { defaultRidingModel } from './default-model';
import { honestSpread } from './honest-spread';
import { longOutcomes, newcomerOutcomes, Outcome, outcomesOf, RiderLog, toDailyLogs } from './lessons';
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
  const logs = toDailyLogs(riders);
  const own = shipped ? logs.length / (logs.length + shipped.riders) : 1;
  const mix = (ours: readonly number[], theirs: readonly number[] | undefined) =>
    ours.map((v, i) => Math.round(1e4 * (own * v + (1 - own) * (theirs?.[i] ?? v))) / 1e4);
  const season = mix(fleetSeason(logs), shipped?.season);
  const outcomes = outcomesOf(logs, season, STEP_DAYS);
  const newcomers = newcomerOutcomes(logs, season);
  const long = longOutcomes(logs);
  if (Math.min(outcomes.length, newcomers.length, long.length) === 0) return shipped ?? defaultRidingModel;
  const learn = (taught: readonly Outcome[], prior: Coefficients | undefined) => {
    const coefficients = fitCoefficients(taught, ITERATIONS, prior && { prior, own });
    const spread = honestSpread(taught, prior && { prior, own });
    return { ...coefficients, spread: mix([spread], prior && [prior.spread])[0]! };
  };
  return {
    version: 'learned-2',
    season,
    ...learn(outcomes, shipped ?? undefined),
    newcomer: learn(newcomers, shipped?.newcomer),
    blank: blankQuantiles(long).map((row, i) => mix(row, shipped?.blank[i])),
    riders: logs.length,
    origins: outcomes.length,
  };
}
