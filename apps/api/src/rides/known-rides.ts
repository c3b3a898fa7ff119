import { sameRide } from '@halfpitch/ride-files';
import { plusDays } from '../common/calendar';

/** What tells two records of one ride. */
export interface KnownRide {
  date: string;
  startedAt: string | null;
  distanceM: number;
  movingS: number | null;
  elapsedS: number | null;
}

/** Rides that are there already, to tell the same ride from another device or typed in by hand. */
export class KnownRides {
  private readonly byDay = new Map<string, KnownRide[]>();

  constructor(rides: readonly KnownRide[]) {
    for (const ride of rides) this.add(ride);
  }

  add(ride: KnownRide): void {
    this.byDay.set(ride.date, [...(this.byDay.get(ride.date) ?? []), ride]);
  }

  /**
   * Whether this ride is there already. A record without a start stands for one ride only: two equal ways to work on
   * one day, one of them typed in, are two rides.
   */
  has(ride: KnownRide): boolean {
    for (const day of [ride.date, plusDays(ride.date, -1), plusDays(ride.date, 1)]) {
      const same = this.byDay.get(day)?.find((known) => sameRide(known, ride));
      if (!same) continue;
      if (same.startedAt === null) this.drop(same);
      return true;
    }
    return false;
  }

  private drop(ride: KnownRide): void {
    this.byDay.set(
      ride.date,
      (this.byDay.get(ride.date) ?? []).filter((known) => known !== ride),
    );
  }
}
