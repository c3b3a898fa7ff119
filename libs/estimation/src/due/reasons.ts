import type { ChainHistory, Factors, Reason } from '../types';
import { lubricationReasons } from './lubrication-reasons';
import { replacementReasons } from './replacement-reasons';
import type { DueState } from './state';

const MEASURABLE_DAYS = 1;
const MOST = 4;
/** Told even where they moved nothing by a day: they say what the window rests on. */
const ALWAYS: ReadonlySet<Reason['code']> = new Set([
  'treatment',
  'new-chain',
  'calendar-limit',
  'quiet-log',
]);

/** What moved the windows since the last estimate, the strongest first. */
export function whyMoved(history: ChainHistory, factors: Factors, state: DueState): Reason[] {
  const { previous } = history;
  if (!previous) return [{ code: 'first-estimate', about: 'lubrication', days: 0, data: {} }];
  return [
    ...lubricationReasons(history, previous, factors, state),
    ...replacementReasons(history, previous, state),
  ]
    .filter(({ code, days }) => Math.abs(days) >= MEASURABLE_DAYS || ALWAYS.has(code))
    .sort((a, b) => Math.abs(b.days) - Math.abs(a.days))
    .slice(0, MOST);
}
