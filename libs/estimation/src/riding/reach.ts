import { DailyLog, kmBetween } from './daily-log';
import { seasonDay } from './season';

const YEAR = 364;
const RATE_DAYS = [28, 90, 365];
const LONGEST_RATE = 365;

/** A possible future told by a simple rule: `times` these km, summed by day. */
export interface Path {
  sums: Float64Array;
  times: number;
}

/** Recent rates carried on through the fleet's season, and last year's riding over again. */
export function simplePaths(log: DailyLog, o: number, season: readonly number[], days: number): Path[] {
  const today = log.first + o;
  const shape = summed(days, (d) => season[seasonDay(today + d)]!);
  const before = summed(Math.min(LONGEST_RATE, o), (d) => season[seasonDay(today - 1 - d)]!);
  const carried = RATE_DAYS.map((w) => {
    const span = Math.min(w, o);
    const seasonal = 7 + (span > 0 ? before[span - 1]! : 0);
    return { sums: shape, times: (kmBetween(log, o - span, o) + 2.1) / seasonal };
  });
  if (o < YEAR + 28) return [...carried, carried[2]!, carried[2]!];
  const lastYear = summed(days, (d) => log.km[o - YEAR + (d % YEAR)]!);
  const ratio = (kmBetween(log, o - 90, o) + 20) / (kmBetween(log, o - YEAR - 90, o - YEAR) + 20);
  const scale = Math.sqrt(Math.min(Math.max(ratio, 0.3), 3));
  return [...carried, { sums: lastYear, times: scale }, { sums: lastYear, times: 1 }];
}

function summed(days: number, of: (d: number) => number): Float64Array {
  const sums = new Float64Array(days);
  let sum = 0;
  for (let d = 0; d < days; d++) sums[d] = sum += of(d);
  return sums;
}

/** Log of the day on which each path reaches `km`, at most `horizon`. */
export function reachFeatures(paths: readonly Path[], km: number, horizon: number): number[] {
  return paths.map(({ sums, times }) => Math.log(Math.min(firstReaching(sums, km / times) + 1, horizon)));
}

/** First index at which an ascending array reaches `km`; its length when it never does. */
export function firstReaching(path: Float64Array, km: number): number {
  let low = 0;
  let high = path.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (path[middle]! >= km) high = middle;
    else low = middle + 1;
  }
  return low;
}
