import type { Day } from '../types';
import type { UnloggedGap } from '../unlogged';

/** Days by which a date moved; 0 where either is beyond the horizon. Negative = earlier. */
export const movedBy = (from: Day | null, to: Day | null): number =>
  from === null || to === null ? 0 : to - from;

/** Unlogged km, known only since the last estimate, of the days after `since`. */
export function freshUnloggedKm(gaps: readonly UnloggedGap[], knownBefore: Day, since: Day): number {
  return gaps.reduce((sum, { from, to, km }) => {
    const days = to - Math.max(from, since + 1) + 1;
    return to > knownBefore && days > 0 ? sum + (km * days) / (to - from + 1) : sum;
  }, 0);
}
