import type { ArrivalCondition, ReadingMethod, TreatmentKind } from '@halfpitch/contracts';
import type { Checkpoint, Reading, Treatment } from '@halfpitch/estimation';
import type { EntityManager } from 'typeorm';
import { groupBy } from './group-by';

interface ReadingRow {
  id: string;
  chain_id: string;
  day: number;
  method: ReadingMethod;
  values_pct: number[] | null;
  lower_pct: number | null;
  upper_pct: number | null;
  baseline: boolean;
}
interface TreatmentRow {
  id: string;
  chain_id: string;
  day: number;
  kind: TreatmentKind;
  arrival: ArrivalCondition;
}
interface CheckpointRow {
  bike_id: string;
  day: number;
  odometer_m: number;
}

/** What was measured on and done to chains, and what their bikes' odometers showed. */
export interface ChainRecords {
  readings: Map<string, Reading[]>;
  treatments: Map<string, Treatment[]>;
  checkpoints: Map<string, Checkpoint[]>;
}

const DAY = `day - date '1970-01-01' as day`;

export async function readRecords(
  manager: EntityManager,
  chainIds: readonly string[],
  bikeIds: readonly string[],
): Promise<ChainRecords> {
  const readings = await manager.query<ReadingRow[]>(
    `select id, chain_id, ${DAY}, method, values_pct, lower_pct, upper_pct, baseline from reading
     where chain_id = any($1) order by day, id`,
    [chainIds],
  );
  const treatments = await manager.query<TreatmentRow[]>(
    `select id, chain_id, ${DAY}, kind, arrival from treatment where chain_id = any($1) order by day, id`,
    [chainIds],
  );
  const checkpoints = await manager.query<CheckpointRow[]>(
    `select bike_id, ${DAY}, odometer_m from odometer_reading where bike_id = any($1) order by day`,
    [bikeIds],
  );
  return {
    readings: groupBy(readings, (row) => row.chain_id, toReading),
    treatments: groupBy(
      treatments,
      (row) => row.chain_id,
      ({ chain_id: _, ...treatment }) => treatment,
    ),
    checkpoints: groupBy(
      checkpoints,
      (row) => row.bike_id,
      (row) => ({ day: row.day, odometerKm: row.odometer_m / 1000 }),
    ),
  };
}

const toReading = ({ id, day, method, values_pct, lower_pct, upper_pct, baseline }: ReadingRow): Reading => ({
  id,
  day,
  method,
  values: values_pct ?? undefined,
  lower: lower_pct ?? undefined,
  upper: upper_pct ?? undefined,
  baseline,
});
