import type { Reading } from '@halfpitch/contracts';
import { elongation } from '../../app/format';

/** What a reading says: its worst place, or what goes in and what does not. */
export function readingWords({ values, lower, upper }: Pick<Reading, 'values' | 'lower' | 'upper'>): string {
  if (values) return elongation(Math.max(...values));
  const parts = [lower !== null && `${lower} goes in`, upper !== null && `${upper} does not`];
  return parts.filter(Boolean).join(', ');
}
