import { Injectable } from '@nestjs/common';
import type { FitChain } from '@halfpitch/contracts';
import { IsNull } from 'typeorm';
import { BikesService } from '../bikes/bikes.service';
import type { Actor } from '../common/actor';
import { plusDays, refuseFuture } from '../common/calendar';
import { Clock } from '../common/clock';
import { conflict, unprocessable } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { ChainChanges } from './chain-changes';
import { Chain } from './chain.entity';
import { mayFit } from './chains.policy';
import { Fitting } from './fitting.entity';
import { RideChains } from './ride-chains';

/**
 * Puts chains on bikes and takes them off. Fittings of one bike, and of one chain, never share a day: who fits a chain
 * in the morning rides the day on it. Fitting the earlier chain again on the same day leaves no trace of the swap.
 */
@Injectable()
export class FittingService {
  constructor(
    private readonly db: TenantDb,
    private readonly bikes: BikesService,
    private readonly rideChains: RideChains,
    private readonly changes: ChainChanges,
    private readonly clock: Clock,
  ) {}

  /** Puts a chain on a bike from `day` on; the chain on it goes into the box. */
  async fit(actor: Actor, chain: Chain, { bikeId, day }: FitChain): Promise<void> {
    const bike = await this.bikes.reach(actor, bikeId);
    if (!mayFit(chain, bike))
      throw unprocessable('bikeId', 'That bike belongs to another rider than the chain.');
    await this.refuseUse(actor, chain, day);
    const ended = await this.endFrom(chain, bikeId, day);
    await this.begin(actor, chain, bikeId, day);
    await this.settle(
      [bikeId, ...ended.map((fitting) => fitting.bikeId)],
      [chain.id, ...ended.map((fitting) => fitting.chainId)],
    );
  }

  /** Puts a chain into the box; `day` was its last on the bike. */
  async takeOff(chain: Chain, day: string): Promise<void> {
    const { manager } = this.db;
    const fitting = await manager.findOneBy(Fitting, { chainId: chain.id, toDay: IsNull() });
    if (!fitting) return;
    if (day < fitting.fromDay)
      throw unprocessable('day', `It was put on the bike on ${fitting.fromDay}, after that day.`);
    await manager.update(Fitting, fitting.id, { toDay: day });
    await this.settle([fitting.bikeId], [chain.id]);
  }

  async box(actor: Actor, chain: Chain, day: string): Promise<void> {
    refuseFuture(day, this.clock.today(actor.timeZone));
    await this.takeOff(chain, day);
  }

  /** Lets the rides of these bikes follow the history, and has every chain concerned estimated anew. */
  async settle(bikeIds: string[], chainIds: string[]): Promise<void> {
    const moved = await this.rideChains.follow([...new Set(bikeIds)]);
    await this.changes.changed(...chainIds, ...moved);
  }

  /** A chain can be on a bike only while it is in service, and not in days to come. */
  async refuseUse(actor: Actor, chain: Chain, day: string, path = 'day'): Promise<void> {
    if (chain.retiredOn !== null) throw conflict(`It was retired on ${chain.retiredOn}. Take it back first.`);
    if (day < chain.inServiceOn)
      throw unprocessable(path, `It went into service on ${chain.inServiceOn}, after that day.`);
    refuseFuture(day, this.clock.today(actor.timeZone), path);
  }

  /** Ends what is on the bike, and where the chain is, the day before; what began that very day is dropped. */
  private async endFrom(chain: Chain, bikeId: string, day: string): Promise<Fitting[]> {
    const { manager } = this.db;
    await manager.query('select from bike where id = $1 for update', [bikeId]);
    await manager.query('select from chain where id = $1 for update', [chain.id]);
    const running = await manager
      .createQueryBuilder(Fitting, 'fitting')
      .where('(fitting.bikeId = :bikeId or fitting.chainId = :chainId)', { bikeId, chainId: chain.id })
      .andWhere('(fitting.toDay is null or fitting.toDay >= :day)', { day })
      .getMany();
    const later = running.find(({ fromDay }) => fromDay > day);
    if (later)
      throw unprocessable(
        'day',
        `The chain was changed again on ${later.fromDay}. Give a later day, or correct the fitting history.`,
      );
    for (const fitting of running) {
      if (fitting.fromDay === day) await manager.delete(Fitting, fitting.id);
      else await manager.update(Fitting, fitting.id, { toDay: plusDays(day, -1) });
    }
    return running;
  }

  private async begin(actor: Actor, chain: Chain, bikeId: string, day: string): Promise<void> {
    const { manager } = this.db;
    const resumed = { chainId: chain.id, bikeId, toDay: plusDays(day, -1) };
    const { affected } = await manager.update(Fitting, resumed, { toDay: null });
    if (affected) return;
    await manager.insert(
      Fitting,
      Object.assign(new Fitting(), {
        workshopId: actor.workshopId,
        chainId: chain.id,
        bikeId,
        fromDay: day,
      }),
    );
  }
}
