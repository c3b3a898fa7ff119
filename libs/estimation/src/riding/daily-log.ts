import type { Day } from '../types';

/** A rider's log as km on each day from the first ride on; sums[i] = km of the days before day i. */
export interface DailyLog {
  first: Day;
  km: Float64Array;
  sums: Float64Array;
  /** Ride days before day i. */
  rideDays: Int32Array;
}

/** Daily km from the first ride up to and including `last`; later rides and distances of nothing are left out. */
export function dailyLog(rides: readonly { day: Day; km: number }[], last: Day): DailyLog {
  let first = last + 1;
  for (const { day, km } of rides) if (km > 0 && day < first) first = day;
  const km = new Float64Array(Math.max(last - first + 1, 0));
  for (const ride of rides) if (ride.km > 0 && ride.day <= last) km[ride.day - first]! += ride.km;
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
