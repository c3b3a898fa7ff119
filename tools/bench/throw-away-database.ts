import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createInterface } from 'node:readline';

export interface ThrowAwayDatabase {
  appUrl: string;
  ownerUrl: string;
  stop(): Promise<void>;
}

/** A PostgreSQL of its own on loopback, gone after `stop()` or with this process. */
export async function throwAwayDatabase(): Promise<ThrowAwayDatabase> {
  const dir = mkdtempSync(join(tmpdir(), 'halfpitch-bench-'));
  const child = spawn(process.execPath, [join(__dirname, '../postgres/scratch.mjs'), '--dir', dir], {
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const ended = new Promise<void>((resolve) => child.once('exit', () => resolve()));
  const urls = new Map<string, string>();
  for await (const line of createInterface(child.stdout)) {
    const [name = '', url = ''] = line.split(/=(.*)/);
    urls.set(name, url);
    if (urls.has('DATABASE_ADMIN_URL')) break;
  }
  const stop = async () => {
    child.kill('SIGTERM');
    await ended;
    rmSync(dir, { recursive: true, force: true });
  };
  const [appUrl, ownerUrl] = [urls.get('DATABASE_URL'), urls.get('DATABASE_OWNER_URL')];
  if (appUrl && ownerUrl) return { appUrl, ownerUrl, stop };
  await stop();
  throw new Error('The throw-away PostgreSQL did not start.');
}
