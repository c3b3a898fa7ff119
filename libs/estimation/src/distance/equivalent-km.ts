import { monthOf } from '../day';
import { assertWithin } from '../errors';
import type { Factor, Factors, Ride } from '../types';

/** What one km of this ride counts for. Unknown weather is a mixture of dry and wet by the month's share of wet days. */
export function rideFactor(ride: Pick<Ride, 'day' | 'surface' | 'weather'>, factors: Factors): Factor {
  const surface = factors.surface[ride.surface];
  const weather = weatherFactor(ride, factors);
  return { lube: surface.lube * weather.lube, wear: surface.wear * weather.wear };
}

function weatherFactor(
  { day, surface, weather }: Pick<Ride, 'day' | 'surface' | 'weather'>,
  factors: Factors,
): Factor {
  if (surface === 'indoor') return factors.weather.dry;
  if (weather !== 'unknown') return factors.weather[weather];
  const wet = factors.wetShareByMonth[monthOf(day)] ?? 0;
  const mix = (of: keyof Factor) => (1 - wet) * factors.weather.dry[of] + wet * factors.weather.wet[of];
  return { lube: mix('lube'), wear: mix('wear') };
}

/** A ride's distance in lube km and wear km. @throws ImpossibleInputError on a negative or endless distance. */
export function equivalentKm(ride: Ride, factors: Factors): { lubeKm: number; wearKm: number } {
  assertWithin('A ride’s distance in km', ride.km, 0, 5000);
  const { lube, wear } = rideFactor(ride, factors);
  return { lubeKm: ride.km * lube, wearKm: ride.km * wear };
}
