import { assertWithin, ImpossibleInputError } from './errors';
import type { ChainHistory, Ride } from './types';

/** Refuses what cannot be, before anything is estimated from it. @throws ImpossibleInputError */
export function checkHistory(history: ChainHistory): void {
  assertWithin('The wear limit in %', history.limitPct, 0.05, 5);
  assertWithin('The share of riding', history.shareOfRiding, 0, 1);
  checkRides(history.rides);
  if (history.bikeRides !== history.rides) checkRides(history.bikeRides);
  for (const { values, lower, upper } of history.readings) {
    if (values?.length === 0) throw new ImpossibleInputError('A reading has no place measured.');
    if (lower !== undefined && upper !== undefined && lower >= upper)
      throw new ImpossibleInputError(`A reading is above ${lower} % and below ${upper} % at once.`);
    for (const value of values ?? []) assertWithin('An elongation in %', value, -1, 5);
    for (const bound of [lower, upper])
      if (bound !== undefined) assertWithin('An elongation in %', bound, -1, 5);
  }
  for (const { km, from, to } of history.planned) {
    assertWithin('Planned riding in km', km, 0, 20_000);
    assertWithin('The last day of planned riding', to, from, from + 731);
  }
}

const DAYS = 200_000;

function checkRides(rides: readonly Ride[]): void {
  for (const { km, day } of rides) {
    assertWithin('A ride’s distance in km', km, 0, 5000);
    assertWithin('A ride’s day', day, -DAYS, DAYS);
  }
}
