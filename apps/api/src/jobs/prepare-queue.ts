import PgBoss from 'pg-boss';
import { DataSource } from 'typeorm';
import { APP_ROLE } from '../database/migrations/tenant-wall';
import { QUEUES, taskNames } from './tasks';

/** Creates or upgrades the queue's own tables as the owner, and lets the program use them. */
export async function prepareQueue(owner: DataSource, ownerUrl: string): Promise<void> {
  const boss = new PgBoss({ connectionString: ownerUrl, max: 2, supervise: false, schedule: false });
  await boss.start();
  for (const name of taskNames) {
    if (await boss.getQueue(name)) await boss.updateQueue(name, { name, ...QUEUES[name] });
    else await boss.createQueue(name, { name, ...QUEUES[name] });
  }
  await boss.stop({ graceful: false, wait: true });
  await owner.query(`
    grant usage on schema pgboss to ${APP_ROLE};
    grant select, insert, update, delete on all tables in schema pgboss to ${APP_ROLE};
    grant execute on all functions in schema pgboss to ${APP_ROLE};
  `);
}
