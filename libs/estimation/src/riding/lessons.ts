import type { Day } from '../types';
import { DailyLog, dailyLog } from './daily-log';
import { TAUGHT_KM, taughtHorizon } from './model';
import { firstReaching } from './reach';
import { logView } from './view';

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

/** Every outcome that the logs show, at origins every `step` days from three weeks on. */
export function outcomesOf(logs: readonly DailyLog[], season: readonly number[], step: number): Outcome[] {
  return logs.flatMap((log, rider) => {
    const outcomes: Outcome[] = [];
    for (let o = 21; o < log.km.length - 1; o += step) {
      if (log.rideDays[o]! < 4 || log.rideDays[o] === log.rideDays[Math.max(o - 60, 0)]) continue;
      const ahead = log.sums.subarray(o + 1).map((sum) => sum - log.sums[o]!);
      const view = logView(log, o, season);
      for (const km of TAUGHT_KM) {
        const horizon = taughtHorizon(km);
        const reached = firstReaching(ahead, km - 1e-9);
        if (reached === ahead.length && ahead.length < horizon) continue;
        const days = Math.min(reached + 1, horizon);
        outcomes.push({
          rider,
          features: view(km),
          km,
          days,
          horizon,
        });
      }
    }
    return outcomes;
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
