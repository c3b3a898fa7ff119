import { assertWithin, ImpossibleInputError } from '../errors';
import type { PlacedReading } from './model';
import type { RatePrior } from './priors';

/** No chain that still turns has lengthened by more, % (common practice, no source). */
const MOST = 5;
const MOST_WEAR_KM = 1e6;

/** Refuses readings and priors that cannot be. @throws ImpossibleInputError */
export function checkReadings(readings: readonly PlacedReading[], { median, logSd }: RatePrior): void {
  assertWithin('The median wear rate in % per 1,000 km', median, 1e-4, 10);
  assertWithin('The spread of wear rates', logSd, 1e-3, 3);
  for (const { wearKm, values, lower, upper } of readings) {
    assertWithin('The wear km under a reading', wearKm, 0, MOST_WEAR_KM);
    const numbers = [...(values ?? []), ...[lower, upper].filter((bound) => bound !== undefined)];
    if (numbers.length === 0)
      throw new ImpossibleInputError(
        'A reading says nothing: give a number, or the step it is above or below.',
      );
    for (const number of numbers) assertWithin('An elongation in %', number, -1, MOST);
    if (lower !== undefined && upper !== undefined && lower >= upper)
      throw new ImpossibleInputError(`A reading is above ${lower} % and below ${upper} % at once.`);
  }
}
