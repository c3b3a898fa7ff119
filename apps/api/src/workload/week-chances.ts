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

/** Chances of falling due as an estimate keeps them: being due that day already, and in week w from it (that included). */
export interface KeptChances {
  now: number;
  weekly: readonly number[];
}

/**
 * Weekly chances counted from the day an estimate was made, as calendar weeks from `monday`: what fell due before is
 * due in the first week; within a week of the estimate's own, what was not due at once is spread
 * evenly.
 */
export function shiftWeeks(
  { now, weekly }: KeptChances,
  madeOn: number,
  monday: number,
  weeks: number,
): number[] {
  /** Chance of being due before the morning of `day`. */
  const before = (day: number) => {
    if (day <= madeOn) return 0;
    const elapsed = (day - madeOn) / 7;
    const whole = Math.floor(elapsed);
    if (whole === 0) return now + elapsed * ((weekly[0] ?? now) - now);
    const sum = weekly.slice(0, whole).reduce((total, chance) => total + chance, 0);
    return sum + (elapsed - whole) * (weekly[whole] ?? 0);
  };
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
