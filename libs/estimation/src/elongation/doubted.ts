import { isoDay } from '../day';
import { doubts } from './doubt';
import type { ElongationModel, PlacedReading } from './model';
import { defaultElongationModel } from './model';
import type { ElongationPosterior } from './posterior';
import { worstPlace } from './reading-likelihood';

/** Readings that are more likely wrong than right, each with why: kept, but weighed less. */
export function doubtedReadings(
  readings: readonly PlacedReading[],
  posterior: ElongationPosterior,
  model: ElongationModel = defaultElongationModel,
): { readingId: string; because: string }[] {
  const chances = doubts(posterior.grid, posterior.gauges);
  return readings
    .filter(({ id }) => (chances.get(id) ?? 0) > 0.5)
    .map((reading) => ({
      readingId: reading.id,
      because: why(reading, readings, chances, posterior, model),
    }));
}

const shownBy = (reading: PlacedReading): number => worstPlace(reading) ?? reading.lower ?? reading.upper!;

function why(
  reading: PlacedReading,
  all: readonly PlacedReading[],
  chances: ReadonlyMap<string, number>,
  posterior: ElongationPosterior,
  { methods }: ElongationModel,
): string {
  const level = (of: PlacedReading) => shownBy(of) - methods[of.method].offset;
  const expected = posterior.elongationAt(reading.wearKm);
  const range = `${expected.p10.toFixed(2)} to ${expected.p90.toFixed(2)} %`;
  if (level(reading) >= expected.p50)
    return `It shows more wear than everything else known of this chain allows (${range} by then); measure again.`;
  const before = all.find(
    (other) =>
      other.wearKm < reading.wearKm && level(other) > level(reading) && (chances.get(other.id) ?? 0) < 0.5,
  );
  return before
    ? `It shows less than the reading of ${isoDay(before.day)} did, and a worn chain never gets shorter; by then it should be at ${range}.`
    : `It shows less wear than everything else known of this chain allows (${range} by then); measure again.`;
}
