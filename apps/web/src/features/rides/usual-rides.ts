import type { BikeKind, Ride, Surface } from '@halfpitch/contracts';

/** Rides of about one length: their distance is rounded to so many metres. */
const ABOUT_M = 2000;
const MOST = 3;

export type UsualRide = Pick<Ride, 'bikeId' | 'distanceM' | 'surface' | 'weather'>;

/** Rides that come again, most frequent first: the same bike, ground and about the same length, as last ridden. */
export function usualRides(newestFirst: readonly Ride[]): UsualRide[] {
  const kinds = new Map<string, { last: Ride; times: number }>();
  for (const ride of newestFirst) {
    const key = `${ride.bikeId} ${ride.surface} ${Math.round(ride.distanceM / ABOUT_M)}`;
    const known = kinds.get(key);
    if (known) known.times += 1;
    else kinds.set(key, { last: ride, times: 1 });
  }
  return [...kinds.values()]
    .filter(({ times }) => times > 1)
    .sort((a, b) => b.times - a.times)
    .slice(0, MOST)
    .map(({ last: { bikeId, distanceM, surface, weather } }) => ({ bikeId, distanceM, surface, weather }));
}

const GROUND: Partial<Record<BikeKind, Surface>> = {
  gravel: 'gravel',
  mountain: 'mountain',
  trainer: 'indoor',
};

/** What a bike is ridden on: as the last time, or by its kind. */
export function usualSurface(
  bike: { id: string; kind: BikeKind },
  newestFirst: readonly Pick<Ride, 'bikeId' | 'surface'>[],
): Surface {
  return newestFirst.find(({ bikeId }) => bikeId === bike.id)?.surface ?? GROUND[bike.kind] ?? 'road';
}
