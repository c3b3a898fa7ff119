import type { DueWindow } from '@halfpitch/contracts';

/** Chance, 0 to 1, of falling due within `days` days, between the days it is kept for as a straight line. */
export function chanceWithin(window: DueWindow, weekly: readonly number[], days: number): number {
  let sum = 0;
  const known: [day: number, chance: number][] = [
    [0, window.chanceNow],
    [7, window.chanceWithin7],
    [14, window.chanceWithin14],
    [30, window.chanceWithin30],
    ...weekly.map((chance, week): [number, number] => [7 * week + 6, (sum += chance)]),
  ];
  known.sort(([a], [b]) => a - b);
  const next = known.findIndex(([day]) => day >= days);
  if (next < 0) return known.at(-1)![1];
  const [day, chance] = known[next]!;
  const [dayBefore, chanceBefore] = known[Math.max(next - 1, 0)]!;
  if (day === days || day === dayBefore) return chance;
  return chanceBefore + ((chance - chanceBefore) * (days - dayBefore)) / (day - dayBefore);
}
