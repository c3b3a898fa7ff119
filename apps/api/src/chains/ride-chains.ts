import { Injectable } from '@nestjs/common';
import { TenantDb } from '../database/tenant-db';

/** The chain that was on a bike on a day; `ride` is any alias with bike_id and day. */
const chainOnDay = (ride: string) => `(
  select fitting.chain_id from fitting
  where fitting.bike_id = ${ride}.bike_id and fitting.from_day <= ${ride}.day
    and (fitting.to_day is null or fitting.to_day >= ${ride}.day)
  order by fitting.from_day desc limit 1)`;

/** Rides belong to the chain that was on the bike that day, as the fitting history has it. */
@Injectable()
export class RideChains {
  constructor(private readonly db: TenantDb) {}

  /** The chain that was on a bike on each of these days. */
  async chainsOn(bikeId: string, days: string[]): Promise<Map<string, string>> {
    const rows = await this.db.manager.query<{ day: string; chain: string | null }[]>(
      `select wanted.day::text, ${chainOnDay('wanted')} as chain
         from (select distinct $1::uuid as bike_id, unnest($2::date[]) as day) wanted`,
      [bikeId, days],
    );
    return new Map(rows.flatMap(({ day, chain }) => (chain === null ? [] : [[day, chain]])));
  }

  async chainOn(bikeId: string, day: string): Promise<string | null> {
    return (await this.chainsOn(bikeId, [day])).get(day) ?? null;
  }

  /** Gives the rides of these bikes to the chains of their fitting history, and tells which chains lost or won any. */
  async follow(bikeIds: string[]): Promise<(string | null)[]> {
    const rows = await this.db.manager.query<{ id: string | null }[]>(
      `with wanted as (
         select ride.id, ride.chain_id as before, ${chainOnDay('ride')} as after
         from ride where ride.bike_id = any($1)),
       moved as (
         update ride set chain_id = wanted.after from wanted
         where ride.id = wanted.id and wanted.before is distinct from wanted.after
         returning wanted.before, wanted.after)
       select before as id from moved union select after from moved`,
      [bikeIds],
    );
    return rows.map(({ id }) => id);
  }
}
