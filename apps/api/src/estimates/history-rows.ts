import type { BikeKind, Regime } from '@halfpitch/contracts';
import type {
  Checkpoint,
  PlannedRiding,
  PreviousEstimate,
  Reading,
  Ride,
  Treatment,
} from '@halfpitch/estimation';
import type { EntityManager } from 'typeorm';

/** Days as the estimation library counts them. */
const dayCount = (column: string) => `(${column} - date '1970-01-01')`;

/** A chain, the bike it is on or was on last, and since when it first was on that one. */
export interface ChainRow {
  id: string;
  workshopId: string;
  regime: Regime;
  speeds: number;
  wearLimitPct: number | null;
  inServiceOn: number;
  retired: boolean;
  bikeId: string | null;
  bikeKind: BikeKind | null;
  fitted: boolean;
  bikeSince: number | null;
}

/** Locks the chains, so that of two estimates of one chain the later sees what the earlier saw, and reads them. */
export async function chainRows(manager: EntityManager, ids: string[]): Promise<ChainRow[]> {
  await manager.query('select from chain where id = any($1) order by id for no key update', [ids]);
  return manager.query<ChainRow[]>(
    `select chain.id, chain.workshop_id as "workshopId", regime, chain.speeds, wear_limit_pct as "wearLimitPct",
            ${dayCount('in_service_on')} as "inServiceOn", retired_on is not null as retired,
            bike.id as "bikeId", bike.kind as "bikeKind", coalesce(latest.fitted, false) as fitted,
            ${dayCount('(select min(from_day) from fitting where fitting.chain_id = chain.id and fitting.bike_id = bike.id)')}
              as "bikeSince"
       from chain
       left join lateral (
         select bike_id, to_day is null as fitted from fitting where fitting.chain_id = chain.id
         order by to_day desc nulls first, from_day desc limit 1) latest on true
       left join bike on bike.id = latest.bike_id
      where chain.id = any($1) order by chain.id`,
    [ids],
  );
}

/** Rides of one bike on one chain; `inService` tells whether that chain still runs. */
export interface RideGroup {
  bikeId: string;
  chainId: string | null;
  inService: boolean;
  rides: Ride[];
}

/** The order in which the database numbers them, from 1 on. */
const SURFACES: readonly Ride['surface'][] = ['road', 'gravel', 'mountain', 'indoor'];
const WEATHERS: readonly Ride['weather'][] = ['dry', 'damp', 'wet', 'mud', 'unknown'];
const numbered = (column: string, all: readonly string[]) =>
  `array_position('{${all.join()}}', ${column}::text)`;

/** Rides from a JSON list of day, metres, surface and weather, one after the other: read many times faster than words. */
function unpacked(packed: string): Ride[] {
  const numbers = JSON.parse(`[${packed}]`) as number[];
  const rides: Ride[] = [];
  for (let i = 0; i < numbers.length; i += 4)
    rides.push({
      day: numbers[i]!,
      km: numbers[i + 1]! / 1000,
      surface: SURFACES[numbers[i + 2]! - 1]!,
      weather: WEATHERS[numbers[i + 3]! - 1]!,
    });
  return rides;
}

/** All rides of these chains and bikes; they come packed, a row of the database's for each bike and chain. */
export async function rideGroups(
  manager: EntityManager,
  chainIds: string[],
  bikeIds: string[],
): Promise<RideGroup[]> {
  const rows = await manager.query<(Omit<RideGroup, 'rides'> & { packed: string })[]>(
    `select packed.*, chain.retired_on is null as "inService" from (
       select bike_id as "bikeId", chain_id as "chainId",
              string_agg(concat_ws(',', ${dayCount('day')}, distance_m, ${numbered('surface', SURFACES)}, ${numbered('weather', WEATHERS)}), ',') as packed
         from ride where chain_id = any($1) or bike_id = any($2) group by bike_id, chain_id) packed
     left join chain on chain.id = packed."chainId"`,
    [chainIds, bikeIds],
  );
  return rows.map(({ packed, ...group }) => ({ ...group, rides: unpacked(packed) }));
}

export type Of<T> = T & { chainId: string };

export function treatmentRows(manager: EntityManager, ids: string[]): Promise<Of<Treatment>[]> {
  return manager.query(
    `select id, chain_id as "chainId", ${dayCount('day')} as day, kind, arrival from treatment
      where chain_id = any($1) order by day, id`,
    [ids],
  );
}

interface ReadingRow extends Omit<Reading, 'values' | 'lower' | 'upper'> {
  chainId: string;
  values: number[] | null;
  lower: number | null;
  upper: number | null;
}

export async function readingRows(manager: EntityManager, ids: string[]): Promise<Of<Reading>[]> {
  const rows = await manager.query<ReadingRow[]>(
    `select id, chain_id as "chainId", ${dayCount('day')} as day, method, values_pct as values,
            lower_pct as lower, upper_pct as upper, baseline
       from reading where chain_id = any($1) order by day, id`,
    [ids],
  );
  return rows.map(({ values, lower, upper, ...row }) => ({
    ...row,
    values: values ?? undefined,
    lower: lower ?? undefined,
    upper: upper ?? undefined,
  }));
}

export function checkpointRows(
  manager: EntityManager,
  bikeIds: string[],
): Promise<(Checkpoint & { bikeId: string })[]> {
  return manager.query(
    `select bike_id as "bikeId", ${dayCount('day')} as day, odometer_m / 1000.0::float8 as "odometerKm"
       from odometer_reading where bike_id = any($1) order by day`,
    [bikeIds],
  );
}

/** Planned riding of these bikes that is not over yet. */
export function plannedRows(
  manager: EntityManager,
  bikeIds: string[],
  today: string,
): Promise<(PlannedRiding & { bikeId: string })[]> {
  return manager.query(
    `select bike_id as "bikeId", ${dayCount('from_day')} as "from", ${dayCount('to_day')} as "to",
            distance_m / 1000.0::float8 as km
       from planned_riding where bike_id = any($1) and to_day > $2 order by from_day, id`,
    [bikeIds, today],
  );
}

/** What was told about a week ago, or the oldest told before today: against it the reasons explain. */
export function previousRows(
  manager: EntityManager,
  ids: string[],
  today: string,
): Promise<Of<PreviousEstimate>[]> {
  return manager.query(
    `select distinct on (chain_id) chain_id as "chainId", ${dayCount('made_on')} as day,
            ${dayCount('lubrication_p50')} as "lubricationP50", ${dayCount('replacement_p50')} as "replacementP50"
       from estimate where chain_id = any($1) and made_on < $2::date
      order by chain_id, made_on > $2::date - 7, abs($2::date - 7 - made_on)`,
    [ids, today],
  );
}
