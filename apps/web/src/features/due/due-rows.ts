import type { Chain } from '@halfpitch/contracts';
import { dueFor } from '../bench/soonest';
import type { DueFor } from '../bench/soonest';

export interface DueRow extends DueFor {
  key: string;
  chain: Chain;
}

/** A second row for a chain only when the other kind is at least this likely within 14 days. */
const SECOND_FROM = 0.2;

/** One row for what each chain falls due for first, and one for the other kind where that is near too. */
export const dueRows = (chains: readonly Chain[]): DueRow[] =>
  chains.flatMap((chain) =>
    chain.state === null
      ? []
      : dueFor(chain.state)
          .filter(({ window }, i) => i === 0 || window.chanceWithin14 >= SECOND_FROM)
          .map((due) => ({ ...due, chain, key: `${chain.id} ${due.kind}` })),
  );
