import { Injectable } from '@nestjs/common';
import { ConfigService } from '@nestjs/config';
import type { CalendarFeed as FeedView, MadeCalendarFeed } from '@halfpitch/contracts';
import { ActorsService } from '../accounts/actors.service';
import { hashToken, newToken } from '../accounts/secrets';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { notFound } from '../common/problems';
import { Environment } from '../config/environment';
import { TenantDb } from '../database/tenant-db';
import { PlansService } from '../plans/plans.service';
import { WorkshopService } from '../workshop/workshop.service';
import { DueChain, dueEvents, planEvents } from './calendar-events';
import { CalendarFeed } from './calendar-feed.entity';
import { calendarText } from './calendar-text';

const MOST_PLANS = 200;

const DUE = `
  select chain.id, chain.label, bike.name as "bikeName", chain.regime, estimate.made_on::text as "madeOn",
         estimate.made_at as "madeAt", estimate.detail
  from chain
  join fitting on fitting.chain_id = chain.id and fitting.to_day is null
  join bike on bike.id = fitting.bike_id
  join lateral (
    select made_on, made_at, detail from estimate
    where estimate.chain_id = chain.id order by made_on desc limit 1) estimate on true
  where chain.retired_on is null and chain.rider_id = $1
  order by chain.id`;

/** A rider's due windows and planned riding as a calendar that other programs subscribe to. */
@Injectable()
export class CalendarService {
  constructor(
    private readonly db: TenantDb,
    private readonly config: ConfigService<Environment, true>,
    private readonly actors: ActorsService,
    private readonly workshops: WorkshopService,
    private readonly plans: PlansService,
    private readonly clock: Clock,
  ) {}

  async read({ accountId, workshopId }: Actor): Promise<FeedView> {
    const feed = await this.db.manager.findOneBy(CalendarFeed, { accountId, workshopId });
    return { madeAt: feed?.madeAt.toISOString() ?? null };
  }

  /** Makes a new address; the one before stops working. */
  async make({ accountId, workshopId }: Actor): Promise<MadeCalendarFeed> {
    const token = newToken();
    const madeAt = this.clock.now();
    await this.db.manager.save(
      Object.assign(new CalendarFeed(), { accountId, workshopId, tokenHash: hashToken(token), madeAt }),
    );
    const address = `${this.config.get<string>('PUBLIC_URL')}/api/calendar/${token}.ics`;
    return { address, madeAt: madeAt.toISOString() };
  }

  async stop({ accountId, workshopId }: Actor): Promise<void> {
    await this.db.manager.delete(CalendarFeed, { accountId, workshopId });
  }

  /** The calendar behind an address, `token.ics`, for whoever holds it. */
  async text(file: string): Promise<string> {
    const actor = await this.open(file.replace(/\.ics$/, ''));
    const { name } = await this.workshops.current(actor.workshopId);
    const today = this.clock.today(actor.timeZone);
    const chains = await this.db.manager.query<DueChain[]>(DUE, [actor.riderId]);
    const plans = await this.plans.list(actor, { page: 1, size: MOST_PLANS });
    const events = [
      ...dueEvents(chains, today, actor.distanceUnit),
      ...planEvents(plans.items, this.clock.now(), today),
    ];
    return calendarText(`Chains, ${name}`, events, this.config.get<string>('PUBLIC_URL'));
  }

  private async open(token: string): Promise<Actor> {
    const [found] = await this.db.manager.query<{ account_id: string; workshop_id: string }[]>(
      'select * from calendar_feed_for_hash($1)',
      [hashToken(token)],
    );
    const scope = found && { accountId: found.account_id, workshopId: found.workshop_id };
    const actor = scope && (await this.actors.load(scope));
    if (!actor?.riderId) throw notFound('calendar');
    await this.db.enter(scope!);
    return actor;
  }
}
