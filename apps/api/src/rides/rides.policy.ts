import type { Actor } from '../common/actor';
import { mayReachBike } from '../bikes/bikes.policy';

/** Who reaches a bike reaches the rides on it. */
export const mayReachRide = (actor: Pick<Actor, 'role' | 'riderId'>, bike: { riderId: string }): boolean =>
  mayReachBike(actor, bike);

/** The first day that a ride can have: logs older than that are slips of the keyboard. */
export const FIRST_RIDING_DAY = '1990-01-01';

/** Why a ride can't have been on this day, or null where it can. */
export function wrongDay(day: string, today: string): string | null {
  if (day > today) return `${day} is still to come; today is ${today}.`;
  if (day < FIRST_RIDING_DAY) return `${day} is too long ago: check the year.`;
  return null;
}
