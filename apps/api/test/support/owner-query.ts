import { Client } from 'pg';
import type { BootedApp } from './app';

/** Looks into a spec's database as the owner of its tables, past the tenant wall. */
export async function ownerQuery<T extends Record<string, string>[]>(
  { ownerUrl }: BootedApp,
  sql: string,
  values: unknown[] = [],
): Promise<T> {
  const client = new Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    return (await client.query(sql, values)).rows as T;
  } finally {
    await client.end();
  }
}
