import { LEVELS } from '../types';
import type { Outcome } from './lessons';
import { TAUGHT_KM } from './model';

/** Days to each of TAUGHT_KM at each of LEVELS over all outcomes, every rider counting alike; rises with the distance. */
export function blankQuantiles(outcomes: readonly Outcome[]): number[][] {
  const rows = TAUGHT_KM.map((km) => {
    const ofKm = outcomes.filter((outcome) => outcome.km === km).sort((a, b) => a.days - b.days);
    const count = new Map<number, number>();
    for (const { rider } of ofKm) count.set(rider, (count.get(rider) ?? 0) + 1);
    return LEVELS.map((level) => {
      let share = 0;
      const found = ofKm.find(({ rider }) => (share += 1 / (count.get(rider)! * count.size)) >= level);
      return found?.days ?? ofKm.at(-1)!.days;
    });
  });
  for (let i = 1; i < rows.length; i++) rows[i] = rows[i]!.map((days, l) => Math.max(days, rows[i - 1]![l]!));
  return rows;
}
