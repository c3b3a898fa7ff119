import 'reflect-metadata';
import { DataSource } from 'typeorm';
import { dataSourceOptions } from '../database/data-source';
import { prepareQueue } from '../jobs/prepare-queue';

/** Brings the database up to date, as the owner of its tables. */
async function migrate(): Promise<void> {
  const url = process.env.DATABASE_OWNER_URL;
  if (!url)
    throw new Error('DATABASE_OWNER_URL is missing: the address of the database as the owner of its tables.');
  const owner = await new DataSource(dataSourceOptions(url, 2)).initialize();
  try {
    const done = await owner.runMigrations();
    await prepareQueue(owner, url);
    console.log(
      done.length ? `Database brought up to date (${done.length} steps).` : 'Database is up to date.',
    );
  } finally {
    await owner.destroy();
  }
}

migrate().catch((error: Error) => {
  console.error(`The database could not be brought up to date: ${error.message}`);
  process.exitCode = 1;
});
