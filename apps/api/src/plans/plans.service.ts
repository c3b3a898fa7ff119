import { Injectable } from '@nestjs/common';
import type { Page, Plan, PlanInput, PlanQuery } from '@halfpitch/contracts';
import { BikesService } from '../bikes/bikes.service';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { notFound, unprocessable } from '../common/problems';
import { Conditions, pageOfSql } from '../common/sql-page';
import { TenantDb } from '../database/tenant-db';
import { ridersInReach } from '../riders/riders.policy';
import { PLAN_COLUMNS, PLAN_FROM, PlanRow, toPlan } from './plan-list';
import { PlannedRiding } from './planned-riding.entity';

/** Riding to come beside the usual; the estimates of the bike's chains follow each change. */
@Injectable()
export class PlansService {
  constructor(
    private readonly db: TenantDb,
    private readonly bikes: BikesService,
    private readonly clock: Clock,
  ) {}

  /** Those that are not over yet, the soonest first. */
  async list(actor: Actor, { bikeId, riderId, ...paging }: PlanQuery): Promise<Page<Plan>> {
    const today = this.clock.today(actor.timeZone);
    const { where, values } = new Conditions()
      .add('plan.to_day >= ?', today)
      .add('bike.rider_id = ?', ridersInReach(actor, riderId))
      .add('plan.bike_id = ?', bikeId);
    const order = 'plan.from_day, plan.id';
    const list = { columns: PLAN_COLUMNS, from: PLAN_FROM, where, values, order };
    const page = await pageOfSql<PlanRow>(this.db.manager, list, paging);
    return { ...page, items: page.items.map((row) => toPlan(row, today)) };
  }

  async read(actor: Actor, id: string): Promise<Plan> {
    await this.reach(actor, id);
    const [row] = await this.db.manager.query<PlanRow[]>(
      `select ${PLAN_COLUMNS} from ${PLAN_FROM} where plan.id = $1`,
      [id],
    );
    return toPlan(row!, this.clock.today(actor.timeZone));
  }

  async create(actor: Actor, input: PlanInput): Promise<Plan> {
    await this.check(actor, input);
    const plan = Object.assign(new PlannedRiding(), columns(input), { workshopId: actor.workshopId });
    await this.db.manager.insert(PlannedRiding, plan);
    await this.bikes.onChanged.tell(input.bikeId);
    return this.read(actor, plan.id);
  }

  async change(actor: Actor, id: string, input: PlanInput): Promise<Plan> {
    const plan = await this.reach(actor, id);
    await this.check(actor, input);
    await this.db.manager.update(PlannedRiding, id, columns(input));
    for (const bikeId of new Set([plan.bikeId, input.bikeId])) await this.bikes.onChanged.tell(bikeId);
    return this.read(actor, id);
  }

  async remove(actor: Actor, id: string): Promise<void> {
    const plan = await this.reach(actor, id);
    await this.db.manager.delete(PlannedRiding, id);
    await this.bikes.onChanged.tell(plan.bikeId);
  }

  private async reach(actor: Actor, id: string): Promise<PlannedRiding> {
    const plan = await this.db.manager.findOneBy(PlannedRiding, { id });
    if (!plan) throw notFound('plan');
    await this.bikes.reach(actor, plan.bikeId);
    return plan;
  }

  private async check(actor: Actor, { bikeId, to, distanceM }: PlanInput): Promise<void> {
    await this.bikes.reach(actor, bikeId);
    const today = this.clock.today(actor.timeZone);
    if (to < today) throw unprocessable('to', `${to} is over; log what was ridden instead.`);
    if (distanceM === 0) throw unprocessable('distanceM', 'Give the distance that is planned.');
  }
}

const columns = ({ bikeId, name, from, to, distanceM }: PlanInput) => ({
  bikeId,
  name,
  fromDay: from,
  toDay: to,
  distanceM,
});
