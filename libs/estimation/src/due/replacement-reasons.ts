import type { ChainHistory, PreviousEstimate, Reason } from '../types';
import { freshUnloggedKm, movedBy } from './moved';
import type { DueState } from './state';

const about = 'replacement' as const;

/** What moved the replacement window: a reading, or distance that nobody logged. */
export function replacementReasons(
  { readings, today }: ChainHistory,
  previous: PreviousEstimate,
  { replacement, usage }: DueState,
): Reason[] {
  const days = movedBy(previous.replacementP50, replacement.p50);
  const fresh = readings.filter(({ day }) => day > previous.day && day <= today);
  if (fresh.length > 0) return [{ code: 'reading', about, days, data: { readings: fresh.length } }];
  const km = Math.round(freshUnloggedKm(usage.unlogged, previous.day, -Infinity));
  return km > 0 && days < 0 ? [{ code: 'unlogged-distance', about, days, data: { km } }] : [];
}
