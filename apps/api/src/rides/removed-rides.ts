import { Injectable } from '@nestjs/common';
import { TenantDb } from '../database/tenant-db';
import { Ride } from './ride.entity';

/** For so long a removed ride can be put back. */
const KEPT = '1 day';

/** Rides that were removed a short while ago, kept whole. */
@Injectable()
export class RemovedRides {
  constructor(private readonly db: TenantDb) {}

  /** Takes a ride out of the log, and forgets for good what was taken out long ago. */
  async take({ id }: Ride): Promise<void> {
    const { manager } = this.db;
    await manager.query(`delete from removed_ride where removed_at < now() - interval '${KEPT}'`);
    await manager.query(
      `insert into removed_ride (id, workshop_id, bike_id, ride)
       select id, workshop_id, bike_id, to_jsonb(ride) from ride where id = $1`,
      [id],
    );
    await manager.delete(Ride, id);
  }

  /** The bike and day of a ride that can still be put back. */
  async find(id: string): Promise<{ bikeId: string; day: string } | undefined> {
    const [found] = await this.db.manager.query<{ bikeId: string; day: string }[]>(
      `select bike_id as "bikeId", ride->>'day' as day from removed_ride where id = $1`,
      [id],
    );
    return found;
  }

  /**
   * Puts a ride back as what it was, its source and key included, on the chain that is given; false where its file
   * brought it back in the meantime.
   */
  async putBack(id: string, chainId: string | null): Promise<boolean> {
    const { manager } = this.db;
    const back = await manager.query<unknown[]>(
      `insert into ride select (jsonb_populate_record(null::ride, ride || jsonb_build_object('chain_id', $2::uuid))).*
         from removed_ride where id = $1
       on conflict do nothing returning id`,
      [id, chainId],
    );
    await manager.query('delete from removed_ride where id = $1', [id]);
    return back.length > 0;
  }
}
