import type { Surface, Weather } from '@halfpitch/contracts';
import type { Ride } from '@halfpitch/estimation';
import type { EntityManager } from 'typeorm';

interface RideRow {
  chain_id: string | null;
  bike_id: string;
  day: number;
  m: number;
  surface: Surface;
  weather: Weather;
}

export interface LoadedRides {
  ofChain: Map<string, Ride[]>;
  ofBike: Map<string, Ride[]>;
}

/** Every ride of these chains and of the bikes they are on, each read once. Days are days since 1970-01-01. */
export async function loadRides(
  manager: EntityManager,
  chainIds: readonly string[],
  bikeIds: readonly string[],
): Promise<LoadedRides> {
  const columns = `chain_id, bike_id, day - date '1970-01-01' as day, distance_m as m, surface, weather`;
  const rows = await manager.query<RideRow[]>(
    `select ${columns} from ride where bike_id = any($2)
     union all
     select ${columns} from ride where chain_id = any($1) and bike_id <> all($2)`,
    [chainIds, bikeIds],
  );
  const rides: LoadedRides = {
    ofChain: new Map(chainIds.map((id) => [id, []])),
    ofBike: new Map(bikeIds.map((id) => [id, []])),
  };
  for (const { chain_id, bike_id, day, m, surface, weather } of rows) {
    const ride = { day, km: m / 1000, surface, weather };
    if (chain_id) rides.ofChain.get(chain_id)?.push(ride);
    rides.ofBike.get(bike_id)?.push(ride);
  }
  return rides;
}
