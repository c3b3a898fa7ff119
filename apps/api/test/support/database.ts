import { randomBytes } from 'node:crypto';
import { Client } from 'pg';
import { DataSource } from 'typeorm';
import { dataSourceOptions } from '../../src/database/data-source';
import { prepareQueue } from '../../src/jobs/prepare-queue';

function address(variable: string): string {
  const value = process.env[variable];
  if (!value)
    throw new Error(
      `${variable} is missing: npm test sets it; for one spec, start tools/postgres/scratch.mjs.`,
    );
  return value;
}

function onDatabase(url: string, name: string): string {
  const result = new URL(url);
  result.pathname = `/${name}`;
  return result.toString();
}

export interface ScratchDatabase {
  /** As the program's own role. */
  url: string;
  /** As the owner of the tables. */
  ownerUrl: string;
  drop(): Promise<void>;
}

/** A database of a spec's own, with every migration and the queue, on the throw-away cluster. */
export async function scratchDatabase(): Promise<ScratchDatabase> {
  const adminUrl = address('TEST_DATABASE_ADMIN_URL');
  const name = `spec_${randomBytes(6).toString('hex')}`;
  const admin = async (sql: string) => {
    const client = new Client({ connectionString: adminUrl });
    await client.connect();
    await client.query(sql).finally(() => client.end());
  };
  await admin(`create database ${name} owner halfpitch_owner`);
  const ownerUrl = onDatabase(address('TEST_DATABASE_OWNER_URL'), name);
  const owner = await new DataSource(dataSourceOptions(ownerUrl, 2)).initialize();
  await owner.runMigrations();
  await prepareQueue(owner, ownerUrl);
  await owner.destroy();
  return {
    url: onDatabase(address('TEST_DATABASE_URL'), name),
    ownerUrl,
    drop: () => admin(`drop database ${name} with (force)`),
  };
}
