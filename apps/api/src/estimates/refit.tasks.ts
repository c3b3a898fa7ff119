import { Injectable, Logger, OnModuleInit } from '@nestjs/common';
import { chainLesson } from '@halfpitch/estimation';
import type { ChainLesson, Factors } from '@halfpitch/estimation';
import { setImmediate } from 'node:timers/promises';
import { Clock } from '../common/clock';
import { TenantDb } from '../database/tenant-db';
import { QueueService } from '../jobs/queue.service';
import type { Tasks } from '../jobs/tasks';
import { WorkshopService } from '../workshop/workshop.service';
import { ChainHistories, LoadedChain } from './chain-histories';
import { refit } from './refit';
import { refitRiding } from './refit-riding';
import { ridingLogs } from './riding-logs';

const BATCH = 50;
const FIRST = '00000000-0000-0000-0000-000000000000';

/** Learns from what the workshop saw on arrival and measured, and keeps what it learned. */
@Injectable()
export class RefitTasks implements OnModuleInit {
  private readonly logger = new Logger(RefitTasks.name);

  constructor(
    private readonly db: TenantDb,
    private readonly queue: QueueService,
    private readonly workshops: WorkshopService,
    private readonly histories: ChainHistories,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.queue.handle('refit-workshop', (task) => this.refitWorkshop(task));
  }

  async refitWorkshop({ workshopId }: Tasks['refit-workshop']): Promise<void> {
    const workshop = await this.db.run({ workshopId }, () => this.workshops.current(workshopId));
    const today = this.clock.today(workshop.timeZone);
    const lessons = new Map<string, ChainLesson[]>();
    let chains: { id: string; riderId: string }[] = [];
    do {
      const after = chains.at(-1)?.id ?? FIRST;
      chains = await this.db.run({ workshopId }, async () => {
        const next = await this.nextBatch(after);
        const riderOf = new Map(next.map(({ id, riderId }) => [id, riderId]));
        const loaded = await this.histories.load([...riderOf.keys()], today, workshop.settings);
        for (const chain of loaded) {
          const rider = riderOf.get(chain.row.id)!;
          lessons.set(rider, [
            ...(lessons.get(rider) ?? []),
            ...this.lesson(chain, workshop.settings.factors),
          ]);
          await setImmediate();
        }
        return next;
      });
    } while (chains.length === BATCH);
    const logs = await this.db.run({ workshopId }, () => ridingLogs(this.db.manager));
    const model = refit(await refitRiding(logs), lessons, today);
    await this.db.run({ workshopId }, () =>
      this.db.manager.query('update workshop set fleet_model = $2 where id = $1', [
        workshopId,
        JSON.stringify(model),
      ]),
    );
  }

  /** A chain whose record cannot be teaches nothing. */
  private lesson({ row, history }: LoadedChain, factors: Factors): ChainLesson[] {
    try {
      return [chainLesson(history, factors)];
    } catch (error) {
      this.logger.warn(`Chain ${row.id} taught nothing: ${(error as Error).message}`);
      return [];
    }
  }

  private nextBatch(after: string): Promise<{ id: string; riderId: string }[]> {
    return this.db.manager.query(
      `select id, rider_id as "riderId" from chain where id > $1 order by id limit ${BATCH}`,
      [after],
    );
  }
}
