import { Injectable } from '@nestjs/common';
import type {
  Chain as WireChain,
  ChainInput,
  ChainQuery,
  FitChain,
  NewChain,
  Page,
  RetireChain,
} from '@halfpitch/contracts';
import type { Actor } from '../common/actor';
import { refuseFuture } from '../common/calendar';
import { Clock } from '../common/clock';
import { conflict, notFound, unprocessable } from '../common/problems';
import { Conditions, pageOfSql } from '../common/sql-page';
import { TenantDb } from '../database/tenant-db';
import { ridersInReach } from '../riders/riders.policy';
import { RidersService } from '../riders/riders.service';
import { ChainChanges } from './chain-changes';
import { CHAIN_COLUMNS, CHAIN_FROM, CHAIN_ORDER, ChainRow, toChain } from './chain-list';
import { Chain } from './chain.entity';
import { mayReachChain, mayRemoveChain } from './chains.policy';
import { FittingService } from './fitting.service';

@Injectable()
export class ChainsService {
  constructor(
    private readonly db: TenantDb,
    private readonly riders: RidersService,
    private readonly fitting: FittingService,
    private readonly changes: ChainChanges,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor, query: ChainQuery): Promise<Page<WireChain>> {
    const { riderId, bikeId, order, retired, search, ...paging } = query;
    const { where, values } = new Conditions()
      .add('chain.rider_id = ?', ridersInReach(actor, riderId))
      .add('bike.id = ?', bikeId)
      .add(
        `strpos(lower(chain.label || ' ' || rider.name || ' ' || coalesce(bike.name, '')), lower(?)) > 0`,
        search,
      )
      .always(`chain.retired_on is ${retired === 'yes' ? 'not null' : 'null'}`);
    const list = { columns: CHAIN_COLUMNS, from: CHAIN_FROM, where, values, order: CHAIN_ORDER[order] };
    const page = await pageOfSql<ChainRow>(this.db.manager, list, paging);
    return { ...page, items: page.items.map(toChain) };
  }

  async read(actor: Actor, id: string): Promise<WireChain> {
    await this.reach(actor, id);
    const [row] = await this.db.manager.query<ChainRow[]>(
      `select ${CHAIN_COLUMNS} from ${CHAIN_FROM} where chain.id = $1`,
      [id],
    );
    return toChain(row!);
  }

  /** The chain with this id, where who asks may reach it; else there is none. */
  async reach(actor: Actor, id: string): Promise<Chain> {
    const chain = await this.db.manager.findOneBy(Chain, { id });
    if (!chain || !mayReachChain(actor, chain)) throw notFound('chain');
    return chain;
  }

  /** Adds a new chain; with a bike it is fitted on its first day, and the chain that was on it goes into the box. */
  async create(actor: Actor, { bikeId, ...input }: NewChain): Promise<WireChain> {
    await this.riders.reach(actor, input.riderId);
    refuseFuture(input.inServiceOn, this.clock.today(actor.timeZone), 'inServiceOn');
    const chain = Object.assign(new Chain(), input, { workshopId: actor.workshopId });
    await this.db.manager.insert(Chain, chain);
    if (bikeId !== null) await this.fitting.fit(actor, chain, { bikeId, day: input.inServiceOn });
    await this.changes.changed(chain.id);
    return this.read(actor, chain.id);
  }

  async change(actor: Actor, id: string, input: ChainInput): Promise<WireChain> {
    await this.reach(actor, id);
    refuseFuture(input.inServiceOn, this.clock.today(actor.timeZone), 'inServiceOn');
    await this.refuseAfterFirstUse(id, input.inServiceOn);
    await this.db.manager.update(Chain, id, input);
    await this.changes.changed(id);
    return this.read(actor, id);
  }

  /** Puts a chain on a bike; the chain on it goes into the box. */
  async fit(actor: Actor, id: string, input: FitChain): Promise<WireChain> {
    await this.fitting.fit(actor, await this.reach(actor, id), input);
    return this.read(actor, id);
  }

  async box(actor: Actor, id: string, day: string): Promise<WireChain> {
    await this.fitting.box(actor, await this.reach(actor, id), day);
    return this.read(actor, id);
  }

  /** Takes a chain out of service for good, off its bike on that day. */
  async retire(actor: Actor, id: string, { day, because }: RetireChain): Promise<WireChain> {
    const chain = await this.reach(actor, id);
    if (day < chain.inServiceOn)
      throw unprocessable('day', `It went into service on ${chain.inServiceOn}, after that day.`);
    refuseFuture(day, this.clock.today(actor.timeZone));
    await this.fitting.takeOff(chain, day);
    await this.db.manager.update(Chain, id, { retiredOn: day, retiredBecause: because });
    await this.changes.changed(id);
    return this.read(actor, id);
  }

  /** Takes back a retirement: the chain is in the box again. */
  async return(actor: Actor, id: string): Promise<WireChain> {
    await this.reach(actor, id);
    await this.db.manager.update(Chain, id, { retiredOn: null, retiredBecause: null });
    await this.changes.changed(id);
    return this.read(actor, id);
  }

  /** Removes a chain with its readings, treatments and estimates; its rides stay with the bike. */
  async remove(actor: Actor, id: string): Promise<void> {
    await this.reach(actor, id);
    if (!mayRemoveChain(actor, await this.wasTreated(id)))
      throw conflict('The workshop keeps a record of its treatments. Retire it instead.');
    await this.db.manager.delete(Chain, id);
  }

  private async wasTreated(id: string): Promise<boolean> {
    const found = await this.db.manager.query<unknown[]>(
      'select from treatment where chain_id = $1 limit 1',
      [id],
    );
    return found.length > 0;
  }

  /** What happened to a chain happened while it was in service. */
  private async refuseAfterFirstUse(id: string, inServiceOn: string): Promise<void> {
    const [row] = await this.db.manager.query<{ first: string | null }[]>(
      `select least((select min(from_day) from fitting where chain_id = $1),
                    (select min(day) from reading where chain_id = $1),
                    (select min(day) from treatment where chain_id = $1))::text as first`,
      [id],
    );
    if (row?.first && row.first < inServiceOn)
      throw unprocessable('inServiceOn', `It was already in use on ${row.first}.`);
  }
}
