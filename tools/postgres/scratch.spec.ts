import { type ChildProcess, spawn, spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createInterface } from 'node:readline';
import { setTimeout as sleep } from 'node:timers/promises';
import { Client } from 'pg';

jest.setTimeout(60_000);

const program = join(__dirname, 'scratch.mjs');

/** Starts a throw-away cluster as a builder would, and reads the addresses it prints. */
async function startScratch(dir: string) {
  const child: ChildProcess = spawn(process.execPath, [program, '--dir', dir], {
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  if (!child.stdout) throw new Error('no output to read');
  const urls: Record<string, string> = {};
  for await (const line of createInterface(child.stdout)) {
    const [name = '', url = ''] = line.split(/=(.*)/);
    urls[name] = url;
    if (urls.DATABASE_ADMIN_URL) break;
  }
  return { child, app: urls.DATABASE_URL ?? '', admin: urls.DATABASE_ADMIN_URL ?? '' };
}

const end = (child: ChildProcess, signal: NodeJS.Signals) =>
  new Promise<number | null>((resolve) => {
    child.once('exit', (code) => resolve(code));
    child.kill(signal);
  });

async function query(url: string, sql: string): Promise<Record<string, unknown>[]> {
  const client = new Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query<Record<string, unknown>>(sql)).rows;
  } finally {
    await client.end();
  }
}

describe('a throw-away cluster', () => {
  const dir = mkdtempSync(join(tmpdir(), 'cluster-'));
  afterAll(() => rmSync(dir, { recursive: true, force: true }));

  it('gives the server a role that can pass no wall, by password only, on the loopback address only', async () => {
    const { child, app, admin } = await startScratch(dir);
    const [role] = await query(
      app,
      'select rolsuper, rolbypassrls, rolcreatedb from pg_roles where rolname = current_user',
    );
    expect(role).toEqual({ rolsuper: false, rolbypassrls: false, rolcreatedb: false });
    await expect(query(app, 'create table trespass (id int)')).rejects.toThrow(/permission denied/);
    await expect(query(app.replace(/:[^:@]+@/, ':guess@'), 'select 1')).rejects.toThrow(
      /password authentication failed/,
    );
    expect(await query(admin, 'show listen_addresses')).toEqual([{ listen_addresses: '127.0.0.1' }]);
    expect(statSync(join(dir, 'postgres-passwords.json')).mode & 0o777).toBe(0o600);
    expect(await end(child, 'SIGTERM')).toBe(0);
    expect(existsSync(join(dir, 'postgres'))).toBe(false);
  });

  it('refuses a second start on the same folder in one sentence', async () => {
    const { child } = await startScratch(dir);
    const second = spawnSync(process.execPath, [program, '--dir', dir], { encoding: 'utf8' });
    expect(second.status).toBe(1);
    expect(second.stderr.trim()).toMatch(/^.* is in use by another Halfpitch \(process \d+\).*\.$/);
    await end(child, 'SIGINT');
  });

  it('ends cleanly with its launcher, even when that is killed outright, and starts again', async () => {
    const { child, app } = await startScratch(dir);
    await end(child, 'SIGKILL');
    const log = () => readFileSync(join(dir, 'postgres.log'), 'utf8');
    for (let i = 0; i < 100 && !log().includes('database system is shut down'); i += 1) await sleep(100);
    expect(log()).toContain('database system is shut down');
    await expect(query(app, 'select 1')).rejects.toThrow(/ECONNREFUSED/);
    const again = await startScratch(dir);
    expect(await query(again.app, 'select 1 as one')).toEqual([{ one: 1 }]);
    await end(again.child, 'SIGTERM');
  });
});
