import type { PlacedReading } from './elongation/model';
import type { ChainHistory } from './types';
import type { Usage } from './usage';

/** Readings taken by today, each with the chain's wear km then; a baseline is of the new chain. */
export function placedReadings({ readings, today }: ChainHistory, usage: Usage): PlacedReading[] {
  return readings
    .filter(({ day }) => day <= today)
    .map((reading) => ({ ...reading, wearKm: reading.baseline ? 0 : usage.wearKmAt(reading.day) }));
}
