import { BeforeApplicationShutdown, Injectable, Logger, OnApplicationBootstrap } from '@nestjs/common';
import { ConfigService } from '@nestjs/config';
import PgBoss from 'pg-boss';
import { Environment } from '../config/environment';
import { TenantDb } from '../database/tenant-db';
import { TaskName, taskNames, Tasks } from './tasks';

type Handler<N extends TaskName> = (data: Tasks[N]) => Promise<void>;

interface SendOptions {
  /** Of one key, only one task waits. */
  key?: string;
}

/**
 * The queue lives in the same PostgreSQL: a write and the task it causes commit together.
 * Any number of processes may work on it.
 */
@Injectable()
export class QueueService implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger(QueueService.name);
  private readonly boss: PgBoss;
  private readonly handlers = new Map<TaskName, Handler<TaskName>>();

  constructor(
    private readonly config: ConfigService<Environment, true>,
    private readonly db: TenantDb,
  ) {
    this.boss = new PgBoss({
      connectionString: config.get('DATABASE_URL'),
      max: 4,
      migrate: false,
      schedule: false,
      supervise: config.get('ROLE') !== 'http',
    });
    this.boss.on('error', (error) => this.logger.error(error.stack));
  }

  /** Says who does a task; called by features while the application starts. */
  handle<N extends TaskName>(name: N, handler: Handler<N>): void {
    this.handlers.set(name, handler as Handler<TaskName>);
  }

  /** Puts a task into the queue, in the transaction under way: it exists if and only if that commits. */
  async send<N extends TaskName>(name: N, data: Tasks[N], { key }: SendOptions = {}): Promise<void> {
    const db = {
      executeSql: async (text: string, values: unknown[]) => {
        const rows: unknown = await this.db.manager.query(text, values);
        return { rows: Array.isArray(rows) ? rows : [] };
      },
    };
    await this.boss.send(name, data, key ? { db, singletonKey: key } : { db });
  }

  async onApplicationBootstrap(): Promise<void> {
    await this.boss.start();
    if (this.config.get('ROLE') === 'http') return;
    for (const [name, handler] of this.handlers) {
      await this.boss.work<Tasks[TaskName]>(
        name,
        { pollingIntervalSeconds: 0.5, batchSize: 1 },
        async ([job]) => {
          if (job) await handler(job.data);
        },
      );
    }
  }

  async beforeApplicationShutdown(): Promise<void> {
    await this.boss.stop({ graceful: true, wait: true, timeout: 10_000 });
  }

  /** Resolves when nothing that could run now is waiting or under way. For tests and the test hook. */
  async idle(timeoutMs = 30_000): Promise<void> {
    const until = Date.now() + timeoutMs;
    while (Date.now() < until) {
      const [row] = await this.db.manager.query<{ busy: boolean }[]>(
        `select exists (select 1 from pgboss.job where name = any($1) and
           (state = 'active' or (state in ('created', 'retry') and start_after <= now()))) as busy`,
        [taskNames],
      );
      if (!row?.busy) return;
      await new Promise((resolve) => setTimeout(resolve, 50));
    }
    throw new Error('The queue did not run empty in time.');
  }
}
