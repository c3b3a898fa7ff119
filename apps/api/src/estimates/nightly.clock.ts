import { Injectable } from '@nestjs/common';
import { ConfigService } from '@nestjs/config';
import { Cron, CronExpression, Timeout } from '@nestjs/schedule';
import { Clock, dayIn } from '../common/clock';
import { Environment } from '../config/environment';
import { TenantDb } from '../database/tenant-db';
import { QueueService } from '../jobs/queue.service';

/** The night's work begins at this hour of the workshop's own time. */
const NIGHT_HOUR = 3;

/** A clock and nothing more: it asks for the night's work where it is due and not done; any number may tick. */
@Injectable()
export class NightlyClock {
  constructor(
    private readonly config: ConfigService<Environment, true>,
    private readonly db: TenantDb,
    private readonly queue: QueueService,
    private readonly clock: Clock,
  ) {}

  /** A night that was missed is caught up with at the start; with test hooks, tests say when it is night. */
  @Timeout(1000)
  async atStart(): Promise<void> {
    if (!this.config.get('TEST_HOOKS')) await this.tick();
  }

  @Cron(CronExpression.EVERY_10_MINUTES)
  async tick(): Promise<void> {
    if (this.config.get('ROLE') !== 'http') await this.askForNight();
  }

  /** Puts a task into the queue for each workshop whose night has come and is not done. */
  async askForNight(): Promise<void> {
    // An instant NIGHT_HOUR hours ago falls on today's date exactly when the night has come.
    const nightAgo = new Date(this.clock.now().getTime() - NIGHT_HOUR * 3_600_000);
    await this.db.run({}, async () => {
      const workshops = await this.db.manager.query<
        { id: string; time_zone: string; estimated_on: string | null }[]
      >('select id, time_zone, estimated_on::text from workshop_clock()');
      for (const { id, time_zone, estimated_on } of workshops) {
        if (estimated_on !== null && estimated_on >= dayIn(time_zone, nightAgo)) continue;
        await this.queue.send('estimate-workshop', { workshopId: id }, { key: id });
      }
    });
  }
}
