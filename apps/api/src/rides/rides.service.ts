import { Injectable } from '@nestjs/common';
import type { Page, Ride as WireRide, RideInput, RideQuery } from '@halfpitch/contracts';
import { v7 } from 'uuid';
import { BikesService } from '../bikes/bikes.service';
import { ChainChanges } from '../chains/chain-changes';
import { RideChains } from '../chains/ride-chains';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { pageOf } from '../common/paging';
import { conflict, notFound, ProblemException, unprocessable } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { ridersInReach } from '../riders/riders.policy';
import { Bike } from '../bikes/bike.entity';
import { RemovedRides } from './removed-rides';
import { Ride } from './ride.entity';
import { keyOnBike } from './ride-key';
import { mayReachRide, wrongDay } from './rides.policy';

function toRide(ride: Ride): WireRide {
  const { id, bikeId, chainId, day, distanceM, movingS, surface, weather, notes, source } = ride;
  const startedAt = ride.startedAt?.toISOString() ?? null;
  return { id, bikeId, chainId, day, startedAt, distanceM, movingS, surface, weather, notes, source };
}

@Injectable()
export class RidesService {
  constructor(
    private readonly db: TenantDb,
    private readonly bikes: BikesService,
    private readonly rideChains: RideChains,
    private readonly changes: ChainChanges,
    private readonly removed: RemovedRides,
    private readonly clock: Clock,
  ) {}

  list(actor: Actor, { bikeId, chainId, riderId, from, to, ...page }: RideQuery): Promise<Page<WireRide>> {
    const query = this.db.manager
      .createQueryBuilder(Ride, 'ride')
      .orderBy('ride.day', 'DESC')
      .addOrderBy('ride.startedAt', 'DESC', 'NULLS LAST')
      .addOrderBy('ride.id', 'DESC');
    const rider = ridersInReach(actor, riderId);
    if (rider) query.andWhere('ride.bikeId in (select id from bike where rider_id = :rider)', { rider });
    if (bikeId) query.andWhere('ride.bikeId = :bikeId', { bikeId });
    if (chainId) query.andWhere('ride.chainId = :chainId', { chainId });
    if (from) query.andWhere('ride.day >= :from', { from });
    if (to) query.andWhere('ride.day <= :to', { to });
    return pageOf(query, page, toRide);
  }

  async read(actor: Actor, id: string): Promise<WireRide> {
    return toRide(await this.reach(actor, id));
  }

  /** Logs a ride; sent again under the same key, the first is kept and answered. */
  async create(actor: Actor, input: RideInput, key: string | undefined): Promise<WireRide> {
    if (key !== undefined && key.length > 200)
      throw new ProblemException(
        400,
        'Please check what you entered',
        'An Idempotency-Key has at most 200 characters.',
      );
    await this.check(actor, input);
    const fingerprint = key ? `key|${key}` : `typed|${v7()}`;
    const ride = Object.assign(new Ride(), input, {
      workshopId: actor.workshopId,
      chainId: await this.rideChains.chainOn(input.bikeId, input.day),
      source: 'typed',
      fingerprint,
    });
    const { manager } = this.db;
    const { raw } = await manager
      .createQueryBuilder()
      .insert()
      .into(Ride)
      .values(ride)
      .orIgnore()
      .returning('id')
      .execute();
    if ((raw as unknown[]).length === 0)
      return toRide(await manager.findOneByOrFail(Ride, { bikeId: input.bikeId, fingerprint }));
    await this.told(actor, ride);
    return toRide(ride);
  }

  async change(actor: Actor, id: string, input: RideInput): Promise<WireRide> {
    const ride = await this.reach(actor, id);
    await this.check(actor, input);
    const before = { ...ride };
    const chainId = await this.rideChains.chainOn(input.bikeId, input.day);
    const fingerprint = keyOnBike(ride.fingerprint, ride.bikeId, input.bikeId);
    await this.db.manager.save(Ride, Object.assign(ride, input, { chainId, fingerprint }));
    await this.told(actor, before, ride);
    return toRide(ride);
  }

  async remove(actor: Actor, id: string): Promise<void> {
    const ride = await this.reach(actor, id);
    await this.removed.take(ride);
    await this.told(actor, ride);
  }

  /** Puts a ride back that was removed a short while ago: a ride of a file stays one. */
  async restore(actor: Actor, id: string): Promise<WireRide> {
    const found = await this.removed.find(id);
    if (!found) return toRide(await this.reach(actor, id));
    await this.bikes.reach(actor, found.bikeId);
    const chainId = await this.rideChains.chainOn(found.bikeId, found.day);
    if (!(await this.removed.putBack(id, chainId)))
      throw conflict('The ride is there again already: its file was read in the meantime.');
    const ride = await this.reach(actor, id);
    await this.told(actor, ride);
    return toRide(ride);
  }

  private async reach(actor: Actor, id: string): Promise<Ride> {
    const { manager } = this.db;
    const ride = await manager.findOneBy(Ride, { id });
    const bike = ride && (await manager.findOneBy(Bike, { id: ride.bikeId }));
    if (!ride || !bike || !mayReachRide(actor, bike)) throw notFound('ride');
    return ride;
  }

  private async check(actor: Actor, { bikeId, day }: RideInput): Promise<void> {
    await this.bikes.reach(actor, bikeId);
    const wrong = wrongDay(day, this.clock.today(actor.timeZone));
    if (wrong) throw unprocessable('day', wrong);
  }

  /** Concerned are the chain that was ridden and, since the forecast learns from the bike's riding, the one on it now. */
  private async told(actor: Actor, ...rides: Pick<Ride, 'bikeId' | 'chainId'>[]): Promise<void> {
    const today = this.clock.today(actor.timeZone);
    const chains = rides.map(({ chainId }) => chainId);
    for (const { bikeId } of rides) chains.push(await this.rideChains.chainOn(bikeId, today));
    await this.changes.changed(...chains);
  }
}
