import { Injectable } from '@nestjs/common';
import { ChainHistory, dayOf, defaultWearLimitPct } from '@halfpitch/estimation';
import { TenantDb } from '../database/tenant-db';
import type { StoredSettings } from '../workshop/workshop.entity';
import {
  ChainRow,
  chainRows,
  checkpointRows,
  plannedRows,
  previousRows,
  readingRows,
  RideGroup,
  rideGroups,
  treatmentRows,
} from './history-rows';
import { shareOfRiding } from './share-of-riding';

export interface LoadedChain {
  row: ChainRow;
  history: ChainHistory;
}

function groupBy<T>(items: T[], keyOf: (item: T) => string | null): Map<string, T[]> {
  const groups = new Map<string, T[]>();
  for (const item of items) {
    const key = keyOf(item);
    if (key === null) continue;
    const group = groups.get(key);
    if (group) group.push(item);
    else groups.set(key, [item]);
  }
  return groups;
}

const ridesOf = (groups: RideGroup[] = []) => groups.flatMap(({ rides }) => rides);

/** Loads everything known of many chains, one query for each table however many chains. */
@Injectable()
export class ChainHistories {
  constructor(private readonly db: TenantDb) {}

  async load(ids: string[], today: string, settings: StoredSettings): Promise<LoadedChain[]> {
    const { manager } = this.db;
    const rows = await chainRows(manager, ids);
    const bikeIds = [...new Set(rows.flatMap(({ bikeId }) => bikeId ?? []))];
    const groups = await rideGroups(manager, ids, bikeIds);
    const byChain = groupBy(groups, ({ chainId }) => chainId);
    const byBike = groupBy(groups, ({ bikeId }) => bikeId);
    const treatments = groupBy(await treatmentRows(manager, ids), ({ chainId }) => chainId);
    const readings = groupBy(await readingRows(manager, ids), ({ chainId }) => chainId);
    const checkpoints = groupBy(await checkpointRows(manager, bikeIds), ({ bikeId }) => bikeId);
    const planned = groupBy(await plannedRows(manager, bikeIds, today), ({ bikeId }) => bikeId);
    const previous = groupBy(await previousRows(manager, ids, today), ({ chainId }) => chainId);
    return rows.map((row) => ({
      row,
      history: {
        today: dayOf(today),
        bikeKind: row.bikeKind ?? 'road',
        regime: row.regime,
        limitPct: row.wearLimitPct ?? defaultWearLimitPct(row.speeds),
        inServiceOn: row.inServiceOn,
        rides: ridesOf(byChain.get(row.id)),
        bikeRides: ridesOf(byBike.get(row.bikeId ?? '')),
        fitted: row.fitted,
        shareOfRiding: shareOfRiding(row, byBike.get(row.bikeId ?? '') ?? [], dayOf(today)),
        readings: readings.get(row.id) ?? [],
        treatments: treatments.get(row.id) ?? [],
        planned: planned.get(row.bikeId ?? '') ?? [],
        checkpoints: sinceFitted(checkpoints.get(row.bikeId ?? '') ?? [], row.bikeSince),
        calendarLimitDays: settings.calendarLimitDays,
        previous: previous.get(row.id)?.[0],
      },
    }));
  }
}

/** The bike's odometer from the last look before this chain first came onto it. */
function sinceFitted<T extends { day: number }>(checkpoints: T[], since: number | null): T[] {
  if (since === null) return [];
  const first = checkpoints.findLastIndex(({ day }) => day <= since);
  return checkpoints.slice(Math.max(first, 0));
}
