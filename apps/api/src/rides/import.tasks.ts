import { Injectable, OnModuleInit } from '@nestjs/common';
import { Clock } from '../common/clock';
import { ChainChanges } from '../chains/chain-changes';
import { TenantDb } from '../database/tenant-db';
import { QueueService } from '../jobs/queue.service';
import type { Tasks } from '../jobs/tasks';
import { WorkshopService } from '../workshop/workshop.service';
import { ImportBatch } from './import-batch';
import { readAside } from './read-aside';
import { ReadFile, ReadRide } from './read-rides';
import { RideImport } from './ride-import.entity';

const BATCH = 200;
const PROBLEMS_KEPT = 50;

/**
 * Reads a received file and keeps its rides, batch by batch, each with its count in a transaction of its own: who looks
 * on sees it grow. Interrupted, it goes on after the last batch that was committed.
 */
@Injectable()
export class ImportTasks implements OnModuleInit {
  constructor(
    private readonly db: TenantDb,
    private readonly queue: QueueService,
    private readonly workshop: WorkshopService,
    private readonly batch: ImportBatch,
    private readonly changes: ChainChanges,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.queue.handle('import-rides', (task) => this.importRides(task));
  }

  async importRides({ workshopId, importId }: Tasks['import-rides']): Promise<void> {
    const scope = { workshopId };
    const opened = await this.db.run(scope, () => this.open(workshopId, importId));
    if (!opened) return;
    const { target, file, timeZone, today } = opened;
    const read = await readAside(target, file, { timeZone, today });
    await this.db.run(scope, () => this.begin(target, read));
    let done = target.added + target.alreadyThere;
    while (done < read.rides.length) {
      const rides = read.rides.slice(done, done + BATCH);
      const kept = await this.db.run(scope, () => this.keep(importId, done, rides));
      if (!kept) return;
      done += rides.length;
    }
    await this.db.run(scope, () => this.finish(importId, read));
  }

  /** The import with its file and calendar, unless it is finished or gone. */
  private async open(workshopId: string, id: string) {
    const { manager } = this.db;
    const target = await manager
      .createQueryBuilder(RideImport, 'import')
      .addSelect('import.file')
      .where('import.id = :id', { id })
      .getOne();
    if (!target?.file) return undefined;
    const { timeZone } = await this.workshop.current(workshopId);
    return { target, file: target.file, timeZone, today: this.clock.today(timeZone) };
  }

  private async begin({ id }: RideImport, { rides, problems, otherSport }: ReadFile): Promise<void> {
    await this.db.manager.update(RideImport, id, {
      state: 'running',
      total: rides.length + problems.length,
      refused: problems.length,
      otherSport,
      problems: problems.slice(0, PROBLEMS_KEPT),
    });
  }

  /** Keeps one batch and counts it; false when another process is at the same import and got ahead. */
  private async keep(id: string, done: number, rides: ReadRide[]): Promise<boolean> {
    const { manager } = this.db;
    const target = await manager.findOne(RideImport, { where: { id }, lock: { mode: 'pessimistic_write' } });
    if (!target || target.added + target.alreadyThere !== done) return false;
    const added = await this.batch.keep(target, rides);
    await manager.update(RideImport, id, {
      added: target.added + added,
      alreadyThere: target.alreadyThere + rides.length - added,
    });
    return true;
  }

  /** Drops the file, and has every chain that was on the bike in those days, or is now, estimated anew. */
  private async finish(id: string, { rides, message }: ReadFile): Promise<void> {
    const { manager } = this.db;
    const target = await manager.findOneByOrFail(RideImport, { id });
    await manager.update(RideImport, id, {
      state: rides.length > 0 ? 'done' : 'failed',
      message,
      file: null,
    });
    if (target.added === 0) return;
    const days = rides.map(({ date }) => date).sort();
    const chains = await manager.query<{ id: string }[]>(
      `select distinct chain_id as id from fitting
        where bike_id = $1 and (to_day is null or (to_day >= $2 and from_day <= $3))`,
      [target.bikeId, days[0], days.at(-1)],
    );
    await this.changes.changed(...chains.map((chain) => chain.id));
  }
}
