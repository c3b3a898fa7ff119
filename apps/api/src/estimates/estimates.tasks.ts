import { Injectable, OnModuleInit } from '@nestjs/common';
import { Clock } from '../common/clock';
import { TenantDb } from '../database/tenant-db';
import { QueueService } from '../jobs/queue.service';
import type { Tasks } from '../jobs/tasks';
import { WorkshopService } from '../workshop/workshop.service';
import { Estimator } from './estimator.service';
import { inTurn } from './in-turn';
import { refitIsDue } from './refit';

/** Chains loaded, estimated and kept in one transaction: bounds the memory, what a crash undoes, and how long they are locked. */
const BATCH = 50;

/** PostgreSQL reads the next batch while this one is worked out. */
const LANES = 2;

@Injectable()
export class EstimatesTasks implements OnModuleInit {
  constructor(
    private readonly db: TenantDb,
    private readonly queue: QueueService,
    private readonly workshops: WorkshopService,
    private readonly estimator: Estimator,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.queue.handle('estimate-chain', (task) => this.estimateChain(task));
    this.queue.handle('estimate-workshop', (task) => this.estimateWorkshop(task));
    this.workshops.onModelChanged.add((workshopId) => this.estimateAnew(workshopId));
  }

  async estimateChain({ workshopId, chainId }: Tasks['estimate-chain']): Promise<void> {
    await this.db.run({ workshopId }, () => this.estimator.estimate(workshopId, [chainId]));
  }

  private estimateAnew(workshopId: string): Promise<void> {
    const since = this.clock.now().toISOString();
    return this.queue.send('estimate-workshop', { workshopId, since }, { key: `${workshopId} ${since}` });
  }

  /**
   * Estimates every chain in service that has no estimate of today. What was done stays done, batch by batch: begun
   * again after a crash, or beside another, it goes on with what is left.
   */
  async estimateWorkshop({ workshopId, since }: Tasks['estimate-workshop']): Promise<void> {
    const today = await this.db.run({ workshopId }, async () => {
      const { timeZone } = await this.workshops.current(workshopId);
      return this.clock.today(timeZone);
    });
    const next = inTurn((after) => this.db.run({ workshopId }, () => this.nextBatch(today, since, after)));
    const lane = async () => {
      for (let ids = await next(); ids.length > 0; ids = await next())
        await this.db.run({ workshopId }, () => this.estimator.estimate(workshopId, ids));
    };
    await Promise.all(Array.from({ length: LANES }, lane));
    await this.db.run({ workshopId }, () => this.finish(workshopId, today));
    await this.db.run({ workshopId }, () => this.askForRefit(workshopId, today));
  }

  /** Once a week the night ends with learning from what it read. */
  private async askForRefit(workshopId: string, today: string): Promise<void> {
    const { fleetModel } = await this.workshops.current(workshopId);
    if (refitIsDue(fleetModel, today))
      await this.queue.send('refit-workshop', { workshopId }, { key: workshopId });
  }

  private async nextBatch(
    today: string,
    since = '-infinity',
    after = '00000000-0000-0000-0000-000000000000',
  ): Promise<string[]> {
    const rows = await this.db.manager.query<{ id: string }[]>(
      `select id from chain
        where retired_on is null and id > $1
          and not exists (select from estimate
                           where chain_id = chain.id and made_on = $2 and made_at >= $3::timestamptz)
        order by id limit ${BATCH}`,
      [after, today, since],
    );
    return rows.map(({ id }) => id);
  }

  private finish(workshopId: string, today: string): Promise<unknown> {
    return this.db.manager.query(
      `update workshop set estimated_on = $2 where id = $1 and (estimated_on is null or estimated_on < $2)`,
      [workshopId, today],
    );
  }
}
