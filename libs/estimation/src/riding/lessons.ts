import type { Day } from '../types';
import { cutBefore, DailyLog, dailyLog } from './daily-log';
import { HORIZON_DAYS, TAUGHT_KM, taughtHorizon } from './model';
import { firstReaching } from './reach';
import { logView } from './view';

const NEWCOMER_STEP = 21;
const NEWCOMER_LENGTHS = [14, 49, 7, 90, 28];

export interface RiderLog {
  rider: string;
  rides: readonly { day: Day; km: number }[];
}

/** What was known at one origin, and how many days it then took to ride so many km. */
export interface Outcome {
  rider: number;
  features: number[];
  km: number;
  days: number;
  horizon: number;
}

/** Every outcome that a log shows, at origins every `step` days from three weeks on. */
export function outcomesOf(log: DailyLog, rider: number, season: readonly number[], step: number): Outcome[] {
  const outcomes: Outcome[] = [];
  for (let o = 21; o < log.km.length - 1; o += step) {
    if (log.rideDays[o]! < 4 || log.rideDays[o] === log.rideDays[Math.max(o - 60, 0)]) continue;
    outcomes.push(...outcomesAt(log, o, rider, logView(log, o, season)));
  }
  return outcomes;
}

/** The same outcomes as a rider would have met them who had only just begun to log. */
export function newcomerOutcomes(log: DailyLog, rider: number, season: readonly number[]): Outcome[] {
  const outcomes: Outcome[] = [];
  for (let i = 0, o = 7; o < log.km.length - 1; i++, o += NEWCOMER_STEP) {
    const length = Math.min(NEWCOMER_LENGTHS[i % NEWCOMER_LENGTHS.length]!, o);
    if (log.rideDays[o] === log.rideDays[o - length]) continue;
    const seen = cutBefore(log, o - length);
    outcomes.push(...outcomesAt(log, o, rider, logView(seen, length, season)));
  }
  return outcomes;
}

/** What followed every fourth week, with a ride in the 60 days before it, where the log goes on for two years more. */
export function longOutcomes(log: DailyLog, rider: number): Outcome[] {
  const outcomes: Outcome[] = [];
  for (let o = 1; o + HORIZON_DAYS < log.km.length; o += 28) {
    if (log.rideDays[o] === log.rideDays[Math.max(o - 60, 0)]) continue;
    for (const km of TAUGHT_KM) {
      const reached = firstReaching(log.sums.subarray(o + 1), log.sums[o]! + km - 1e-9);
      const days = Math.min(reached + 1, HORIZON_DAYS);
      outcomes.push({ rider, features: [], km, days, horizon: HORIZON_DAYS });
    }
  }
  return outcomes;
}

/** How long each taught distance took from day index `o`, where the log goes on long enough to tell. */
function outcomesAt(log: DailyLog, o: number, rider: number, view: (km: number) => number[]): Outcome[] {
  const ahead = log.sums.subarray(o + 1);
  return TAUGHT_KM.flatMap((km) => {
    const horizon = taughtHorizon(km);
    const reached = firstReaching(ahead, log.sums[o]! + km - 1e-9);
    if (reached === ahead.length && ahead.length < horizon) return [];
    return [{ rider, features: view(km), km, days: Math.min(reached + 1, horizon), horizon }];
  });
}

export const toDailyLogs = (riders: readonly RiderLog[]): DailyLog[] =>
  riders
    .filter(({ rides }) => rides.length > 0)
    .map(({ rides }) =>
      dailyLog(
        rides,
        rides.reduce((last, { day }) => Math.max(last, day), -Infinity),
      ),
    );
