import { dayOf } from '@halfpitch/estimation';
import type { RiderLog } from '@halfpitch/estimation';
import type { EntityManager } from 'typeorm';
import { someOf } from './some-of';

/** A log teaches from half a year and twenty ride days on: shorter ones hardly show how riding goes on. */
const LEAST = { days: 180, rideDays: 20 };
/** More logs teach little more; so many take some seconds. */
const MOST_LOGS = 60;

/** The riding of bikes with enough log, one log each, at most 60, evenly over all of them. */
export async function ridingLogs(manager: EntityManager): Promise<RiderLog[]> {
  const bikes = await manager.query<{ id: string }[]>(
    `select bike_id as id from ride group by bike_id
      having count(distinct day) >= $1 and max(day) - min(day) >= $2 order by bike_id`,
    [LEAST.rideDays, LEAST.days],
  );
  const chosen = someOf(
    bikes.map(({ id }) => id),
    MOST_LOGS,
  );
  const days = await manager.query<{ bikeId: string; day: string; km: number }[]>(
    `select bike_id as "bikeId", day::text, sum(distance_m)::float8 / 1000 as km
       from ride where bike_id = any($1) group by bike_id, day order by bike_id, day`,
    [chosen],
  );
  const logs = new Map<string, { day: number; km: number }[]>(chosen.map((id) => [id, []]));
  for (const { bikeId, day, km } of days) logs.get(bikeId)!.push({ day: dayOf(day), km });
  return [...logs].map(([rider, rides]) => ({ rider, rides }));
}
