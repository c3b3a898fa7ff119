import type { Reminder } from '@halfpitch/contracts';

export const stateWords: Record<Reminder['state'], string> = {
  waiting: 'Waiting to go out',
  sent: 'Sent',
  failed: 'Failed',
  held: 'Held',
  closed: 'Closed',
};

export const aboutWords: Record<Reminder['kind'], string> = {
  lubrication: 'Treatment',
  replacement: 'Replacement',
};

/** What the desk can do about a chain's reminder, by what became of it; 'none' before there is one in this cycle. */
export function choicesFor(state: Reminder['state'] | 'none'): ('write' | 'again' | 'hold' | 'release')[] {
  if (state === 'none' || state === 'closed') return ['write', 'hold'];
  if (state === 'waiting') return ['hold'];
  if (state === 'failed') return ['again', 'hold'];
  return state === 'held' ? ['release'] : ['again'];
}

type Subject = Pick<Reminder, 'chainId' | 'kind'>;
const keyOf = ({ chainId, kind }: Subject) => `${chainId} ${kind}`;

/** The newest reminder of each chain and kind, of lists that are newest first or not. */
export function newestBySubject(reminders: readonly Reminder[]): (subject: Subject) => Reminder | undefined {
  const newest = new Map<string, Reminder>();
  for (const one of reminders) {
    const kept = newest.get(keyOf(one));
    if (!kept || kept.createdAt < one.createdAt) newest.set(keyOf(one), one);
  }
  return (subject) => newest.get(keyOf(subject));
}
