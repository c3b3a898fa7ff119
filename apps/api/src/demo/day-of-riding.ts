import type { Surface } from '@halfpitch/contracts';
import type { Habit } from './habits';
import { Random } from './random';
import type { Roads, Traits } from './rider-traits';
import type { DayWeather } from './weather';

/** A ride as it was ridden, logged or not. */
export interface RiddenRide extends Roads {
  distanceM: number;
  movingS: number;
  surface: Surface;
  /** Second of the day at which it began (UTC). */
  startS: number;
}

function roads(random: Random, surface: Surface, { wet, afterRain }: DayWeather): Roads['truly'] {
  if (surface === 'indoor') return 'dry';
  const rough = surface !== 'road';
  if (wet)
    return random.weighted({ wet: rough ? 0.25 : 0.55, mud: rough ? 0.4 : 0.01, damp: 0.27, dry: 0.17 });
  if (afterRain) return random.weighted({ mud: rough ? 0.12 : 0, damp: 0.3, dry: 0.6 });
  return random.chance(0.03) ? 'damp' : 'dry';
}

/** What a rider rides on one day with one bike; `mood` drifts from week to week. */
export function ridesOfDay(
  random: Random,
  habit: Habit,
  { distance, eagerness, weatherUnknown }: Traits,
  weather: DayWeather,
  mood: number,
): RiddenRide[] {
  const { month, weekday, wet } = weather;
  const wish = (habit.week[weekday] ?? 0) * (habit.season[month] ?? 0) * eagerness * Math.exp(mood);
  if (!random.chance(Math.min(wish, 0.97))) return [];
  if (wet && random.chance(habit.staysHome)) return [];
  const weekend = weekday >= 5;
  const median = habit.km[weekend ? 1 : 0] * distance;
  const leg = (startS: number): RiddenRide => {
    const surface = random.weighted<Surface>(habit.surfaces);
    const distanceM = Math.round(1000 * Math.max(random.logNormal(median, habit.spread), 0.8));
    const truly = roads(random, surface, weather);
    const logged = surface !== 'indoor' && random.chance(weatherUnknown) ? 'unknown' : truly;
    const movingS = Math.round((distanceM / 1000 / (habit.kmh * random.logNormal(1, 0.07))) * 3600);
    return { distanceM, movingS, surface, truly, logged, startS };
  };
  if (habit.legs === 2) return [leg(random.int(23_400, 30_600)), leg(random.int(57_600, 66_000))];
  return [leg(weekend ? random.int(28_800, 43_200) : random.int(61_200, 66_600))];
}
