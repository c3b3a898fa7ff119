import { assertWithin } from './errors';
import type { ChainHistory } from './types';

/** Refuses what cannot be, before anything is estimated from it. @throws ImpossibleInputError */
export function checkHistory(history: ChainHistory): void {
  assertWithin('The wear limit in %', history.limitPct, 0.05, 5);
  assertWithin('The share of riding', history.shareOfRiding, 0, 1);
  for (const { km } of [...history.rides, ...history.bikeRides])
    assertWithin('A ride’s distance in km', km, 0, 5000);
  for (const { values, lower, upper } of history.readings) {
    for (const value of values ?? []) assertWithin('An elongation in %', value, -1, 5);
    for (const bound of [lower, upper])
      if (bound !== undefined) assertWithin('An elongation in %', bound, -1, 5);
  }
  for (const { km, from, to } of history.planned) {
    assertWithin('Planned riding in km', km, 0, 20_000);
    assertWithin('The last day of planned riding', to, from, from + 731);
  }
}
