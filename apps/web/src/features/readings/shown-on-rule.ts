import type { Reading } from '@halfpitch/contracts';

/** How far a go/no-go answer without an upper end is drawn, %. */
const OPEN = 0.25;

/** A measurement on the rule: its worst place, or the middle of what a go/no-go answer leaves open. */
export function shownOnRule({ values, lower, upper }: Pick<Reading, 'values' | 'lower' | 'upper'>) {
  if (values) return { value: Math.max(0, ...values) };
  const p10 = lower ?? 0;
  const p90 = upper ?? p10 + OPEN;
  return { value: (p10 + p90) / 2, band: { p10, p90 } };
}
