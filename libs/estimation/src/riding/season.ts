import type { DailyLog } from './daily-log';

export const SEASON_DAYS = 365;
const BANDWIDTH = 14;

/** Day of the year, 0 to 364, of a day since 1970-01-01. */
export const seasonDay = (day: number): number =>
  Math.floor(((day % 365.2425) + 365.2425) % 365.2425) % SEASON_DAYS;

/** How much more or less riders ride on each day of the year than on average: mean over riders, smoothed over two weeks. */
export function fleetSeason(logs: readonly DailyLog[]): number[] {
  const curves = logs.filter(({ km }) => km.length >= 364).map(ownSeason);
  if (curves.length === 0) return new Array<number>(SEASON_DAYS).fill(1);
  const mean = Array.from(
    { length: SEASON_DAYS },
    (_, d) => curves.reduce((sum, c) => sum + c[d]!, 0) / curves.length,
  );
  return smooth(mean);
}

function ownSeason({ first, km }: DailyLog): Float64Array {
  const sum = new Float64Array(SEASON_DAYS);
  const days = new Float64Array(SEASON_DAYS);
  km.forEach((x, i) => {
    sum[seasonDay(first + i)]! += x;
    days[seasonDay(first + i)]! += 1;
  });
  const rate = sum.map((x, d) => x / Math.max(days[d]!, 1));
  const mean = rate.reduce((total, x) => total + x, 0) / SEASON_DAYS;
  return rate.map((x) => x / Math.max(mean, 1e-9));
}

/** Gaussian smoothing around the year, kept to four digits. */
function smooth(curve: readonly number[]): number[] {
  return curve.map((_, d) => {
    let sum = 0;
    let weights = 0;
    for (let k = -3 * BANDWIDTH; k <= 3 * BANDWIDTH; k++) {
      const weight = Math.exp(-0.5 * (k / BANDWIDTH) ** 2);
      sum += weight * curve[(d + k + SEASON_DAYS) % SEASON_DAYS]!;
      weights += weight;
    }
    return Math.round((1e4 * sum) / weights) / 1e4;
  });
}
