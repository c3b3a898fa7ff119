/** One chain's chances of falling due in each of the coming weeks. */
export interface ChainChance {
  chainId: string;
  label: string;
  riderName: string;
  lubrication: number[] | null;
  replacement: number[];
}

const MOST_CHAINS = 20;
const WORTH_NAMING = 0.05;

/**
 * Weekly chances counted from the day an estimate was made, as weeks from today: what fell due before today is due in
 * the first week; within an old week the chance is spread evenly.
 */
export function shiftWeeks(
  weekly: readonly number[],
  madeOn: number,
  today: number,
  weeks: number,
): number[] {
  const daily = (day: number) => (weekly[Math.floor((day - madeOn) / 7)] ?? 0) / 7;
  return Array.from({ length: weeks }, (_, w) => {
    const from = w === 0 ? madeOn : today + 7 * w;
    let chance = 0;
    for (let day = from; day < today + 7 * (w + 1); day++) chance += daily(day);
    return Math.min(chance, 1);
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
    .sort((a, b) => b.chance - a.chance)
    .slice(0, MOST_CHAINS);
}
