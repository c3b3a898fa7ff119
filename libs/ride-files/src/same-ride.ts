import type { FileRide } from './types';

type Told = Pick<FileRide, 'date' | 'startedAt' | 'distanceM' | 'movingS' | 'elapsedS'>;

/** Two devices on one ride start and stop within minutes of each other: they overlap for at least this share of the shorter. */
export const OVERLAP_SHARE = 0.5;
/** A wheel sensor and a satellite receiver differ by a few per cent; 10 % leaves room for a late start (common practice, no source). */
export const DISTANCE_SHARE = 0.1;
/** On very short rides, metres that the distances may differ anyway. */
export const DISTANCE_SLACK_M = 200;

/**
 * Whether two records are one ride, from another device or in another format: their times overlap by half of
 * the shorter, and their distances differ by at most 10 % of the longer (or 200 m). Without both start
 * instants and a duration there is no overlap to judge by, so a ride on the same day with the same distance
 * to within 1 % (at least 10 m) and no start on one side counts as the same.
 */
export function sameRide(a: Told, b: Told): boolean {
  const apart = Math.abs(a.distanceM - b.distanceM);
  const longer = Math.max(a.distanceM, b.distanceM);
  const [first, second] = [interval(a), interval(b)];
  if (first && second) {
    return (
      overlap(first, second) >= OVERLAP_SHARE && apart <= Math.max(DISTANCE_SLACK_M, DISTANCE_SHARE * longer)
    );
  }
  const oneSided = (a.startedAt === null) !== (b.startedAt === null);
  return oneSided && a.date === b.date && apart <= Math.max(10, 0.01 * longer);
}

/** Start and end in epoch ms. */
function interval({ startedAt, elapsedS, movingS }: Told): [number, number] | null {
  const seconds = elapsedS ?? movingS;
  if (startedAt === null || seconds === null) return null;
  const start = Date.parse(startedAt);
  return [start, start + Math.max(1, seconds) * 1000];
}

/** Shared time as a share of the shorter interval, 0 to 1. */
function overlap(a: [number, number], b: [number, number]): number {
  const shared = Math.min(a[1], b[1]) - Math.max(a[0], b[0]);
  return Math.max(0, shared) / Math.min(a[1] - a[0], b[1] - b[0]);
}
