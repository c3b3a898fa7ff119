import type { Actor } from '../common/actor';
import { mayReachChain } from '../chains/chains.policy';

/** Who reaches a chain reaches its readings. */
export const mayReachReading = (
  actor: Pick<Actor, 'role' | 'riderId'>,
  chain: { riderId: string },
): boolean => mayReachChain(actor, chain);

/** A rider takes back what they measured themself; what the bench measured only the bench does. */
export const mayRemoveReading = (
  actor: Pick<Actor, 'role' | 'accountId'>,
  reading: { byAccountId: string | null },
): boolean => actor.role !== 'rider' || actor.accountId === reading.byAccountId;

/** Why a chain can't have been measured on this day, or null where it can. */
export function wrongReadingDay(day: string, chain: { inServiceOn: string }, today: string): string | null {
  if (day > today) return `${day} is still to come; today is ${today}.`;
  if (day < chain.inServiceOn) return `The chain went into service on ${chain.inServiceOn}, after that day.`;
  return null;
}
