import { Injectable } from '@nestjs/common';
import { ChainHistory, dayOf, defaultWearLimitPct } from '@halfpitch/estimation';
import type { BikeKind, Regime } from '@halfpitch/contracts';
import { TenantDb } from '../database/tenant-db';
import type { StoredSettings } from '../workshop/workshop.entity';
import { ChainRecords, readRecords } from './chain-records';
import { loadRides } from './ride-rows';

export interface LoadedHistory {
  chainId: string;
  riderId: string;
  history: ChainHistory;
}

interface ChainRow {
  id: string;
  rider_id: string;
  regime: Regime;
  speeds: number;
  wear_limit_pct: number | null;
  in_service_on: string;
  fitted: boolean;
  bike_id: string | null;
  bike_kind: BikeKind | null;
  chains_on_bike: number;
  made_on: string | null;
  lubrication_p50: string | null;
  replacement_p50: string | null;
}

/** Chains with the bike they are on, or were on last, and what was said of them before today. */
const CHAINS = `
  select chain.id, chain.rider_id, chain.regime, chain.speeds, chain.wear_limit_pct, chain.in_service_on::text,
         fitting.bike_id, fitting.bike_id is not null and fitting.to_day is null as fitted, bike.kind as bike_kind,
         coalesce(rotation.chains, 1)::int as chains_on_bike,
         before.made_on::text, before.lubrication_p50::text, before.replacement_p50::text
  from chain
  left join lateral (
    select bike_id, to_day from fitting where chain_id = chain.id
    order by to_day desc nulls first, from_day desc limit 1) fitting on true
  left join bike on bike.id = fitting.bike_id
  left join lateral (
    select count(distinct other.chain_id) as chains from fitting other join chain c on c.id = other.chain_id
    where other.bike_id = fitting.bike_id and c.retired_on is null) rotation on true
  left join lateral (
    select made_on, lubrication_p50, replacement_p50 from estimate
    where estimate.chain_id = chain.id and made_on < $2 order by made_on desc limit 1) before on true
  where chain.id = any($1)`;

/** Reads everything the library wants to know of some chains: one query per table, however many chains. */
@Injectable()
export class HistoryLoader {
  constructor(private readonly db: TenantDb) {}

  async load(chainIds: readonly string[], today: string, settings: StoredSettings): Promise<LoadedHistory[]> {
    const { manager } = this.db;
    const chains = await manager.query<ChainRow[]>(CHAINS, [chainIds, today]);
    const bikeIds = [...new Set(chains.flatMap(({ bike_id }) => bike_id ?? []))];
    const rides = await loadRides(manager, chainIds, bikeIds);
    const records = await readRecords(manager, chainIds, bikeIds);
    return chains.map((chain) => ({
      chainId: chain.id,
      riderId: chain.rider_id,
      history: toHistory(chain, rides, records, today, settings),
    }));
  }
}

function toHistory(
  chain: ChainRow,
  rides: Awaited<ReturnType<typeof loadRides>>,
  records: ChainRecords,
  today: string,
  settings: StoredSettings,
): ChainHistory {
  const own = rides.ofChain.get(chain.id) ?? [];
  const ofBike = (chain.bike_id && rides.ofBike.get(chain.bike_id)) || own;
  return {
    today: dayOf(today),
    bikeKind: chain.bike_kind ?? 'road',
    regime: chain.regime,
    limitPct: chain.wear_limit_pct ?? defaultWearLimitPct(chain.speeds),
    inServiceOn: dayOf(chain.in_service_on),
    rides: own,
    bikeRides: ofBike,
    fitted: chain.fitted,
    shareOfRiding: 1 / Math.max(chain.chains_on_bike, 1),
    readings: records.readings.get(chain.id) ?? [],
    treatments: records.treatments.get(chain.id) ?? [],
    planned: [],
    checkpoints: (chain.bike_id && records.checkpoints.get(chain.bike_id)) || [],
    calendarLimitDays: settings.calendarLimitDays,
    previous: chain.made_on
      ? {
          day: dayOf(chain.made_on),
          lubricationP50: chain.lubrication_p50 ? dayOf(chain.lubrication_p50) : null,
          replacementP50: chain.replacement_p50 ? dayOf(chain.replacement_p50) : null,
        }
      : undefined,
  };
}
