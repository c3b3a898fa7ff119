import type { DailyLog } from './daily-log';
import { pause } from './features';

const LONGEST_USUAL = 0.95;
const AT_LEAST_DAYS = 21;

/** True when the pause under way is longer than three weeks and than nineteen in twenty of this rider's pauses. */
export function isQuiet(log: DailyLog): boolean {
  const pauses: number[] = [];
  let last = -1;
  log.km.forEach((km, i) => {
    if (km <= 0) return;
    if (last >= 0) pauses.push(i - last);
    last = i;
  });
  const usual = pauses.sort((a, b) => a - b)[Math.floor(LONGEST_USUAL * pauses.length)] ?? 0;
  return last >= 0 && pause(log, log.km.length) > Math.max(AT_LEAST_DAYS, usual);
}
