import type { ChainState, DueWindow } from '@halfpitch/contracts';

export interface DueFor {
  kind: 'lubrication' | 'replacement';
  window: DueWindow;
}

/** From this chance of being due within 14 days on, the other kind is said too. */
const WORTH_SAYING = 0.5;

/** What a chain falls due for, the earlier median first; without a known treatment only its replacement. */
export function dueFor({ lubrication, replacement }: ChainState): [DueFor, ...DueFor[]] {
  const wear: DueFor = { kind: 'replacement', window: replacement };
  if (!lubrication) return [wear];
  const lube: DueFor = { kind: 'lubrication', window: lubrication };
  const wearFirst =
    replacement.p50 !== null && (lubrication.p50 === null || replacement.p50 < lubrication.p50);
  return wearFirst ? [wear, lube] : [lube, wear];
}

/** The soonest, and the other too when it is likely within 14 days. */
export function dueSoon(state: ChainState): DueFor[] {
  const [first, ...others] = dueFor(state);
  return [first, ...others.filter(({ window }) => window.chanceWithin14 >= WORTH_SAYING)];
}
