import { Injectable } from '@nestjs/common';
import { RideChains } from '../chains/ride-chains';
import { plusDays } from '../common/calendar';
import { TenantDb } from '../database/tenant-db';
import { KnownRide, KnownRides } from './known-rides';
import { ReadRide } from './read-rides';
import { movedKey } from './ride-key';
import { RideImport } from './ride-import.entity';
import { Ride } from './ride.entity';

/** Keeps one batch of an import's rides, in the transaction under way. */
@Injectable()
export class ImportBatch {
  constructor(
    private readonly db: TenantDb,
    private readonly rideChains: RideChains,
  ) {}

  /** Inserts what is not there yet and tells how many were. */
  async keep(target: RideImport, rides: ReadRide[]): Promise<number> {
    await this.oneAtATime(target);
    const known = new KnownRides(await this.near(target.riderId, rides));
    const moved = await this.moved(target, rides);
    const fresh = rides.filter(
      (ride) => !moved.has(ride.fingerprint) && !known.has(ride) && (known.add(ride), true),
    );
    if (fresh.length === 0) return 0;
    const chains = await this.rideChains.chainsOn(
      target.bikeId,
      fresh.map(({ date }) => date),
    );
    const rows = fresh.map((ride) => toRow(target, ride, chains.get(ride.date) ?? null));
    const { raw } = await this.db.manager
      .createQueryBuilder()
      .insert()
      .into(Ride)
      .values(rows)
      .orIgnore()
      .returning('id')
      .execute();
    return (raw as unknown[]).length;
  }

  /** Two files of one rider, read at once, could hold the same ride: until the commit the others wait. */
  private async oneAtATime({ riderId }: RideImport): Promise<void> {
    await this.db.manager.query('select pg_advisory_xact_lock(hashtextextended($1, 0))', [riderId]);
  }

  /** Keys of these rides that were read for this bike before and went to another since. */
  private async moved({ bikeId, riderId }: RideImport, rides: ReadRide[]): Promise<Set<string>> {
    const keys = new Map(rides.map(({ fingerprint }) => [movedKey(bikeId, fingerprint), fingerprint]));
    const rows = await this.db.manager.query<{ key: string }[]>(
      `select fingerprint as key from ride join bike on bike.id = ride.bike_id
        where bike.rider_id = $1 and fingerprint = any($2)`,
      [riderId, [...keys.keys()]],
    );
    return new Set(rows.map(({ key }) => keys.get(key)!));
  }

  /** The rider's rides of these days, on whichever bike. */
  private near(riderId: string, rides: ReadRide[]): Promise<KnownRide[]> {
    const days = rides.map(({ date }) => date).sort();
    return this.db.manager.query<KnownRide[]>(
      `select ride.day::text as date, distance_m as "distanceM", moving_s as "movingS", null as "elapsedS",
              to_char(started_at at time zone 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS"Z"') as "startedAt"
         from ride join bike on bike.id = ride.bike_id
        where bike.rider_id = $1 and ride.day between $2 and $3`,
      [riderId, plusDays(days[0]!, -1), plusDays(days.at(-1)!, 1)],
    );
  }
}

function toRow(target: RideImport, ride: ReadRide, chainId: string | null): Ride {
  const surface = ride.surface ?? (ride.indoor ? 'indoor' : target.surface);
  return Object.assign(new Ride(), {
    workshopId: target.workshopId,
    bikeId: target.bikeId,
    chainId,
    day: ride.date,
    startedAt: ride.startedAt === null ? null : new Date(ride.startedAt),
    distanceM: Math.round(ride.distanceM),
    movingS: ride.movingS === null ? null : Math.round(ride.movingS),
    surface,
    weather: ride.weather ?? (surface === 'indoor' ? 'dry' : target.weather),
    source: ride.format,
    fingerprint: ride.fingerprint,
  });
}
