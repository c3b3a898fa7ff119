import { Injectable } from '@nestjs/common';
import type { Fitting as WireFitting, FittingInput, Page, PageQuery } from '@halfpitch/contracts';
import { BikesService } from '../bikes/bikes.service';
import type { Actor } from '../common/actor';
import { refuseFuture } from '../common/calendar';
import { Clock } from '../common/clock';
import { conflict, notFound, unprocessable } from '../common/problems';
import { pageOfSql } from '../common/sql-page';
import { TenantDb } from '../database/tenant-db';
import { Chain } from './chain.entity';
import { ChainsService } from './chains.service';
import { mayFit } from './chains.policy';
import { Fitting } from './fitting.entity';
import { FittingService } from './fitting.service';

const COLUMNS = `fitting.id, fitting.chain_id as "chainId", fitting.bike_id as "bikeId", bike.name as "bikeName",
  fitting.from_day::text as "from", fitting.to_day::text as "to"`;
const FROM = 'fitting join bike on bike.id = fitting.bike_id';

/** Which bike a chain was on when, and corrections of it: the rides follow. */
@Injectable()
export class FittingHistoryService {
  constructor(
    private readonly db: TenantDb,
    private readonly bikes: BikesService,
    private readonly chains: ChainsService,
    private readonly fitting: FittingService,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor, chainId: string, page: PageQuery): Promise<Page<WireFitting>> {
    await this.chains.reach(actor, chainId);
    const list = { columns: COLUMNS, from: FROM, where: 'fitting.chain_id = $1', values: [chainId] };
    return pageOfSql(this.db.manager, { ...list, order: 'fitting.from_day desc' }, page);
  }

  async correct(actor: Actor, id: string, input: FittingInput): Promise<WireFitting> {
    const { fitting, chain } = await this.reach(actor, id);
    const bike = await this.bikes.reach(actor, input.bikeId);
    if (!mayFit(chain, bike))
      throw unprocessable('bikeId', 'That bike belongs to another rider than the chain.');
    await this.refuseDays(actor, chain, input);
    await this.refuseOverlap(fitting, input);
    await this.db.manager.update(Fitting, id, {
      bikeId: input.bikeId,
      fromDay: input.from,
      toDay: input.to,
    });
    await this.fitting.settle([fitting.bikeId, input.bikeId], [chain.id]);
    const [row] = await this.db.manager.query<WireFitting[]>(
      `select ${COLUMNS} from ${FROM} where fitting.id = $1`,
      [id],
    );
    return row!;
  }

  async remove(actor: Actor, id: string): Promise<void> {
    const { fitting, chain } = await this.reach(actor, id);
    await this.db.manager.delete(Fitting, id);
    await this.fitting.settle([fitting.bikeId], [chain.id]);
  }

  private async reach(actor: Actor, id: string): Promise<{ fitting: Fitting; chain: Chain }> {
    const fitting = await this.db.manager.findOneBy(Fitting, { id });
    if (!fitting) throw notFound('entry of the fitting history');
    return { fitting, chain: await this.chains.reach(actor, fitting.chainId) };
  }

  private async refuseDays(actor: Actor, chain: Chain, { from, to }: FittingInput): Promise<void> {
    if (to === null) return this.fitting.refuseUse(actor, chain, from, 'from');
    if (from < chain.inServiceOn)
      throw unprocessable('from', `It went into service on ${chain.inServiceOn}, after that day.`);
    if (chain.retiredOn !== null && to > chain.retiredOn)
      throw unprocessable('to', `It was retired on ${chain.retiredOn}, before that day.`);
    refuseFuture(to, this.clock.today(actor.timeZone), 'to');
  }

  /** On one day a bike has one chain, and a chain is on one bike. */
  private async refuseOverlap({ id, chainId }: Fitting, { bikeId, from, to }: FittingInput): Promise<void> {
    const [other] = await this.db.manager.query<
      { label: string; bike: string; from: string; to: string | null }[]
    >(
      `select chain.label, bike.name as bike, fitting.from_day::text as "from", fitting.to_day::text as "to"
         from ${FROM} join chain on chain.id = fitting.chain_id
        where fitting.id <> $1 and (fitting.chain_id = $2 or fitting.bike_id = $3)
          and daterange(fitting.from_day, fitting.to_day, '[]') && daterange($4::date, $5::date, '[]')
        order by fitting.from_day limit 1`,
      [id, chainId, bikeId, from, to],
    );
    if (!other) return;
    const span = other.to === null ? `Since ${other.from}` : `From ${other.from} to ${other.to}`;
    throw conflict(`${span} the chain “${other.label}” is on “${other.bike}”. Correct that entry first.`);
  }
}
