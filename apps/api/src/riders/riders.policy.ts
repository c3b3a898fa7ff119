import type { Actor } from '../common/actor';

type Who = Pick<Actor, 'role' | 'riderId'>;

/** Staff reach every rider of the workshop, a rider only themself. */
export const mayReachRider = (actor: Who, riderId: string): boolean =>
  actor.role !== 'rider' || actor.riderId === riderId;

/** A rider that does not exist: what a list is limited to when its reader may see nobody. */
const NOBODY = '00000000-0000-0000-0000-000000000000';

/** The rider that a list is limited to: for a rider themself, for staff whom they asked for, or none. */
export function ridersInReach(actor: Who, wanted?: string): string | undefined {
  if (actor.role !== 'rider') return wanted;
  return wanted === undefined || wanted === actor.riderId ? (actor.riderId ?? NOBODY) : NOBODY;
}
