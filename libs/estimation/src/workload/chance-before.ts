import type { Day } from '../types';

/** Chances of falling due as an estimate keeps them: being due that day already, and in week w from it (that included). */
export interface KeptChances {
  now: number;
  weekly: readonly number[];
}

/**
 * Chance of being due before the morning of `day`, by an estimate made on `madeOn`; within a week what was not due at
 * once is spread evenly.
 */
export function chanceBefore({ now, weekly }: KeptChances, madeOn: Day, day: Day): number {
  if (day <= madeOn) return 0;
  const elapsed = (day - madeOn) / 7;
  const whole = Math.floor(elapsed);
  if (whole === 0) return now + elapsed * ((weekly[0] ?? now) - now);
  const sum = weekly.slice(0, whole).reduce((total, chance) => total + chance, 0);
  return sum + (elapsed - whole) * (weekly[whole] ?? 0);
}
