import type { Day } from '../types';

/** A rider's log as km on each day from the first ride on; sums[i] = km of the days before day i. */
export interface DailyLog {
  first: Day;
  km: Float64Array;
  sums: Float64Array;
  /** Ride days before day i. */
  rideDays: Int32Array;
}

/** Thirty years: what is older says nothing of the riding ahead. */
const LONGEST_DAYS = 10_957;

/** Daily km from the first ride up to and including `last`; later rides, far older ones and distances of nothing are left out. */
export function dailyLog(rides: readonly { day: Day; km: number }[], last: Day): DailyLog {
  const counts = (ride: { day: Day; km: number }) =>
    ride.km > 0 && ride.day <= last && ride.day > last - LONGEST_DAYS;
  let first = last + 1;
  for (const ride of rides) if (counts(ride) && ride.day < first) first = ride.day;
  const km = new Float64Array(last - first + 1);
  for (const ride of rides) if (counts(ride)) km[ride.day - first]! += ride.km;
  return withSums(first, km);
}

/** The same log as if it had begun on day index `from`. */
export const cutBefore = ({ first, km }: DailyLog, from: number): DailyLog =>
  withSums(first + from, km.subarray(from));

function withSums(first: Day, km: Float64Array): DailyLog {
  const sums = new Float64Array(km.length + 1);
  const rideDays = new Int32Array(km.length + 1);
  for (let i = 0; i < km.length; i++) {
    sums[i + 1] = sums[i]! + km[i]!;
    rideDays[i + 1] = rideDays[i]! + (km[i]! > 0 ? 1 : 0);
  }
  return { first, km, sums, rideDays };
}

/** Km from day index `from` up to but without `to`, both held inside the log. */
export function kmBetween({ sums }: DailyLog, from: number, to: number): number {
  const inside = (i: number) => sums[Math.min(Math.max(i, 0), sums.length - 1)]!;
  return inside(to) - inside(from);
}
