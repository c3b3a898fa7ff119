import type { ChainEstimate, DueWindow } from '@halfpitch/contracts';
import { chance } from '../../app/format';
import { methodWords } from '../../components/trade-words';

/** Between these a window shrinks to about half its length. */
const [HALF_FROM, HALF_TO] = [0.42, 0.58];

/** What would make the window for replacement narrower; null when nothing would. */
export function narrowWords(narrows: ChainEstimate['narrows']): string | null {
  if (!narrows) return null;
  const { method, factor } = narrows;
  const gauge = `A reading with a ${methodWords[method].toLowerCase()}`;
  if (factor >= HALF_FROM && factor <= HALF_TO) return `${gauge} would about halve it.`;
  return `${gauge} would make it about ${Math.round((1 - factor) * 100)} % shorter.`;
}

/** How likely it is due by then, as pairs of words. */
export function chanceWords(window: DueWindow): [string, string][] {
  return [
    ['now', chance(window.chanceNow)],
    ['within a week', chance(window.chanceWithin7)],
    ['within two weeks', chance(window.chanceWithin14)],
    ['within 30 days', chance(window.chanceWithin30)],
  ];
}
