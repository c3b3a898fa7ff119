import { chanceBefore } from '@halfpitch/estimation';
import type { KeptChances } from '@halfpitch/estimation';

/** One chain's chances of falling due in each of the coming weeks. */
export interface ChainChance {
  chainId: string;
  label: string;
  riderName: string;
  /** Its treatment is a dip into the pot. */
  dipped: boolean;
  lubrication: number[] | null;
  replacement: number[];
  /** Chance that a treatment given now falls due in week w from now. */
  renewal?: number[];
}

const MOST_CHAINS = 20;
const WORTH_NAMING = 0.05;

/** The Monday of the week that a day falls in; days are counted since 1970-01-01, a Thursday. */
export const mondayOf = (day: number): number => day - ((day + 3) % 7);

/**
 * Weekly chances counted from the day an estimate was made, as calendar weeks from `monday`: what fell due before is
 * due in the first week; within a week of the estimate's own, what was not due at once is spread
 * evenly.
 */
export function shiftWeeks(kept: KeptChances, madeOn: number, monday: number, weeks: number): number[] {
  const before = (day: number) => chanceBefore(kept, madeOn, day);
  return Array.from({ length: weeks }, (_, w) => {
    const since = w === 0 ? 0 : before(monday + 7 * w);
    return Math.min(Math.max(before(monday + 7 * (w + 1)) - since, 0), 1);
  });
}

/** The chains most likely to fall due in week `w`, the likeliest first. */
export function chainsOfWeek(chains: readonly ChainChance[], w: number) {
  return chains
    .flatMap(({ chainId, label, riderName, lubrication, replacement }) => [
      { chainId, label, riderName, kind: 'lubrication' as const, chance: lubrication?.[w] ?? 0 },
      { chainId, label, riderName, kind: 'replacement' as const, chance: replacement[w] ?? 0 },
    ])
    .filter(({ chance }) => chance >= WORTH_NAMING)
    .sort((a, b) => b.chance - a.chance || (a.chainId < b.chainId ? -1 : 1))
    .slice(0, MOST_CHAINS);
}
