import type { FileRide } from './types';

type Told = Pick<FileRide, 'date' | 'startedAt' | 'distanceM'>;

/** What is alike in rides that one file may hold twice: day, start where known, distance to 10 m. */
function rideLikeness(ride: Told): string {
  const start = ride.startedAt === null ? '-' : new Date(ride.startedAt).toISOString().slice(0, 19);
  return `${ride.date}|${start}|${Math.round(ride.distanceM / 10)}`;
}

/**
 * Stable key of a ride within a rider's rides, so that a file imported twice doubles nothing.
 * @param ordinal 0 for the first ride of this likeness in the file, 1 for the second, and so on
 */
export function rideFingerprint(ride: Told, ordinal: number): string {
  return `${rideLikeness(ride)}|${ordinal}`;
}

/** Fingerprints of all rides of one file, in its order: two equal rides on one day keep two keys. */
export function fingerprintAll(rides: readonly Told[]): string[] {
  const seen = new Map<string, number>();
  return rides.map((ride) => {
    const likeness = rideLikeness(ride);
    const ordinal = seen.get(likeness) ?? 0;
    seen.set(likeness, ordinal + 1);
    return rideFingerprint(ride, ordinal);
  });
}
