import { Injectable, OnModuleInit } from '@nestjs/common';
import { BikesService } from '../bikes/bikes.service';
import { TenantDb } from '../database/tenant-db';
import { QueueService } from '../jobs/queue.service';

/** Where everything that moves a chain's estimate is told: its chain is estimated anew once the change is committed. */
@Injectable()
export class ChainChanges implements OnModuleInit {
  constructor(
    private readonly db: TenantDb,
    private readonly queue: QueueService,
    private readonly bikes: BikesService,
  ) {}

  onModuleInit(): void {
    this.bikes.onChanged.add((bikeId) => this.bikeChanged(bikeId));
  }

  /** Asks for a new estimate of these chains, each once. */
  async changed(...chainIds: (string | null)[]): Promise<void> {
    const ids = [...new Set(chainIds)].filter((id) => id !== null).sort();
    if (ids.length === 0) return;
    await this.holdWaiting(ids);
    const [row] = await this.db.manager.query<{ id: string }[]>('select current_workshop() as id');
    for (const chainId of ids)
      await this.queue.send('estimate-chain', { workshopId: row!.id, chainId }, { key: chainId });
  }

  /** Asks for a new estimate of every chain that was on a bike. */
  async bikeChanged(bikeId: string): Promise<void> {
    const chains = await this.db.manager.query<{ id: string }[]>(
      'select distinct chain_id as id from fitting where bike_id = $1',
      [bikeId],
    );
    await this.changed(...chains.map(({ id }) => id));
  }

  /**
   * Keeps tasks that already wait for these chains waiting until this transaction ends. Of one chain one task waits at
   * most; were it taken up before the commit, it would miss what this transaction writes.
   */
  private async holdWaiting(chainIds: string[]): Promise<void> {
    await this.db.manager.query(
      `select id from pgboss.job where name = 'estimate-chain' and state = 'created' and singleton_key = any($1)
         order by singleton_key for update`,
      [chainIds],
    );
  }
}
