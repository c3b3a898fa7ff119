import type { ElongationPosterior, PlacedReading } from './posterior';

/** Readings that are more likely wrong than right, each with why: kept, but weighed less. */
export function doubtedReadings(readings: readonly PlacedReading[], posterior: ElongationPosterior) {
  return readings
    .filter(({ id }) => (posterior.doubt.get(id) ?? 0) > 0.5)
    .map((reading) => ({ readingId: reading.id, because: why(reading, posterior) }));
}

function why(reading: PlacedReading, posterior: ElongationPosterior): string {
  const expected = posterior.elongationAt(reading.wearKm);
  const shown = reading.values ? Math.max(...reading.values) : (reading.lower ?? reading.upper ?? 0);
  const range = `${expected.p10.toFixed(2)} to ${expected.p90.toFixed(2)} %`;
  return shown < expected.p50
    ? `It shows less than the other readings allow (${range}); a worn chain never gets shorter.`
    : `It shows more than the other readings allow (${range}); measure again under tension.`;
}
