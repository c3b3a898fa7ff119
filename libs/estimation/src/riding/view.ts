import type { DailyLog } from './daily-log';
import { logFeatures } from './features';
import { HORIZON_DAYS, taughtHorizon } from './model';
import { reachFeatures, simplePaths } from './reach';
import { replay, replayFeatures } from './replay';

/** All that the log up to (and without) day index `o` says of riding `km` more, as the regression's features. */
export function logView(log: DailyLog, o: number, season: readonly number[]): (km: number) => number[] {
  const base = logFeatures(log, o);
  const paths = simplePaths(log, o, season, HORIZON_DAYS);
  const past = replay(log, o);
  return (km) => {
    const horizon = taughtHorizon(km);
    return [...base, ...reachFeatures(paths, km, horizon), ...replayFeatures(past, km, horizon)];
  };
}
