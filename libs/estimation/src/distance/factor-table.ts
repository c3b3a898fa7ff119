import { monthOf } from '../day';
import type { Factor, Factors, Ride, Surface, Weather } from '../types';
import { rideFactor } from './equivalent-km';

const SURFACES: readonly Surface[] = ['road', 'gravel', 'mountain', 'indoor'];
const WEATHERS: readonly Weather[] = ['dry', 'damp', 'wet', 'mud'];

/** rideFactor for very many rides: the few answers there are, worked out once. */
export function factorTable(factors: Factors): (ride: Ride) => Factor {
  const known = {} as Record<string, Record<string, Factor>>;
  const unknown = {} as Record<string, Factor[]>;
  for (const surface of SURFACES) {
    known[surface] = {};
    for (const weather of WEATHERS)
      known[surface][weather] = rideFactor({ day: 0, surface, weather }, factors);
    unknown[surface] = Array.from({ length: 12 }, (_, month) =>
      rideFactor({ day: month * 30.5 + 10, surface, weather: 'unknown' }, factors),
    );
  }
  return ({ day, surface, weather }) =>
    weather === 'unknown' ? unknown[surface]![monthOf(day)]! : known[surface]![weather]!;
}
