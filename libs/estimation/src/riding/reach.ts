import { DailyLog, kmBetween } from './daily-log';
import { seasonDay } from './season';

const YEAR = 364;

/** Possible futures told by simple rules, as km summed by day: each says when so many km would be reached. */
export type Paths = Float64Array[];

/** Recent rates carried on through the fleet's season, and last year's riding over again. */
export function simplePaths(log: DailyLog, o: number, season: readonly number[], days: number): Paths {
  const today = log.first + o;
  const seasonal = (day: number) => season[seasonDay(day)]!;
  const rateOver = (w: number) => {
    const span = Math.min(w, o);
    let past = 7;
    for (let d = 1; d <= span; d++) past += seasonal(today - d);
    return (kmBetween(log, o - span, o) + 2.1) / past;
  };
  const shape = summed(days, (d) => seasonal(today + d));
  const carried = [28, 90, 365].map(rateOver).map((rate) => shape.map((x) => x * rate));
  if (o < YEAR + 28) return [...carried, carried[2]!, carried[2]!];
  const lastYear = summed(days, (d) => log.km[o - YEAR + (d % YEAR)]!);
  const ratio = (kmBetween(log, o - 90, o) + 20) / (kmBetween(log, o - YEAR - 90, o - YEAR) + 20);
  const scale = Math.sqrt(Math.min(Math.max(ratio, 0.3), 3));
  return [...carried, lastYear.map((x) => x * scale), lastYear];
}

function summed(days: number, of: (d: number) => number): Float64Array {
  const sums = new Float64Array(days);
  let sum = 0;
  for (let d = 0; d < days; d++) sums[d] = sum += of(d);
  return sums;
}

/** Log of the day on which each path reaches `km`, at most `horizon`. */
export function reachFeatures(paths: Paths, km: number, horizon: number): number[] {
  return paths.map((path) => Math.log(Math.min(firstReaching(path, km) + 1, horizon)));
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
