import { Random } from './random';

/**
 * Share of wet days (1 mm and more) by month, January first: a rainy temperate town. Source: seattle-weather.csv of
 * npm vega-datasets (BSD-3-Clause, 1,461 days of 2012-15), read; evened out over neighbouring months.
 */
export const WET_SHARE = [0.47, 0.49, 0.48, 0.39, 0.24, 0.18, 0.09, 0.13, 0.21, 0.4, 0.51, 0.56];

/** How much likelier rain is after rain: correlation of neighbouring days, as in the same source. */
export const PERSISTENCE = 0.38;

export const monthOf = (day: number): number => new Date(day * 86_400_000).getUTCMonth();
/** Monday = 0. 1970-01-01 was a Thursday. */
export const weekdayOf = (day: number): number => (day + 3) % 7;

export interface DayWeather {
  month: number;
  weekday: number;
  wet: boolean;
  /** It rained the day before: roads dry, tracks do not. */
  afterRain: boolean;
}

/** The town's weather on each day from `from` to `to`: wet days come in runs. */
export function townWeather(random: Random, from: number, to: number): DayWeather[] {
  let wet = random.chance(WET_SHARE[monthOf(from)] ?? 0);
  return Array.from({ length: to - from + 1 }, (_, i) => {
    const month = monthOf(from + i);
    const share = WET_SHARE[month] ?? 0;
    const afterRain = wet;
    wet = random.chance(wet ? share + PERSISTENCE * (1 - share) : share * (1 - PERSISTENCE));
    return { month, weekday: weekdayOf(from + i), wet, afterRain };
  });
}
