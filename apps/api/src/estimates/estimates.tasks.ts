import { Injectable, OnModuleInit } from '@nestjs/common';
import { Clock } from '../common/clock';
import { TenantDb } from '../database/tenant-db';
import { QueueService } from '../jobs/queue.service';
import type { Tasks } from '../jobs/tasks';
import { Workshop } from '../workshop/workshop.entity';
import { EstimateChainsService } from './estimate-chains.service';

/** Chains estimated in one transaction: enough that queries cost little, few enough that memory stays small. */
const BATCH = 200;

/** Chains in service that have no estimate of today yet, those of one bike together. */
const NEXT = `
  select chain.id from chain
  left join fitting on fitting.chain_id = chain.id and fitting.to_day is null
  where chain.retired_on is null
    and not exists (select 1 from estimate where chain_id = chain.id and made_on = $1 and made_at >= $2)
  order by chain.rider_id, fitting.bike_id, chain.id
  limit ${BATCH}`;

@Injectable()
export class EstimatesTasks implements OnModuleInit {
  constructor(
    private readonly db: TenantDb,
    private readonly queue: QueueService,
    private readonly estimates: EstimateChainsService,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.queue.handle('estimate-chain', (task) => this.estimateChain(task));
    this.queue.handle('estimate-workshop', (task) => this.estimateWorkshop(task));
  }

  async estimateChain({ workshopId, chainId }: Tasks['estimate-chain']): Promise<void> {
    await this.db.run({ workshopId }, async () => {
      const [workshop] = await this.db.manager.find(Workshop, { where: { id: workshopId } });
      if (workshop) await this.estimates.estimate(workshop, [chainId]);
    });
  }

  /** The night's work: every chain in service, batch by batch, each batch in a transaction of its own. */
  async estimateWorkshop({ workshopId }: Tasks['estimate-workshop']): Promise<void> {
    const began = this.clock.now();
    while (await this.db.run({ workshopId }, () => this.nextBatch(workshopId, began)));
  }

  /** Estimates the next batch; the last one marks the day as done. */
  private async nextBatch(workshopId: string, began: Date): Promise<boolean> {
    const workshop = await this.db.manager.findOneByOrFail(Workshop, { id: workshopId });
    const today = this.clock.today(workshop.timeZone);
    const chains = await this.db.manager.query<{ id: string }[]>(NEXT, [today, began]);
    if (chains.length > 0)
      await this.estimates.estimate(
        workshop,
        chains.map(({ id }) => id),
      );
    if (chains.length === BATCH) return true;
    await this.db.manager.update(Workshop, workshopId, { estimatedOn: today });
    return false;
  }
}
