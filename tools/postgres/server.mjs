import { openSync, closeSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { spawnBound } from '../process/bound-child.mjs';
import { run } from '../process/run.mjs';
import { Trouble } from '../process/trouble.mjs';

const careless = { fsync: 'off', synchronous_commit: 'off', full_page_writes: 'off' };

/** Starts the server on the loopback address; when we die, it gets SIGINT: its fast, clean shutdown. */
function launch({ dir, bin, port, identity, throwAway }) {
  const settings = {
    listen_addresses: '127.0.0.1',
    port,
    unix_socket_directories: '',
    timezone: 'UTC',
    log_timezone: 'UTC',
    ...(throwAway ? careless : {}),
  };
  const options = Object.entries(settings).flatMap(([name, value]) => ['-c', `${name}=${value}`]);
  const log = openSync(join(dir, 'postgres.log'), 'w', 0o600);
  const child = spawnBound(join(bin, 'postgres'), ['-D', join(dir, 'postgres'), ...options], {
    deathSignal: 'INT',
    privileges: identity.privileges,
    stdio: ['ignore', log, log],
    env: { PATH: process.env.PATH },
    cwd: '/',
  });
  closeSync(log);
  return child;
}

function complaint(dir) {
  const lines = readFileSync(join(dir, 'postgres.log'), 'utf8').trim().split('\n');
  const fatal = lines.find((line) => /FATAL|ERROR|PANIC/.test(line)) ?? lines.at(-1) ?? '';
  return fatal.replace(/^.*?(FATAL|ERROR|PANIC):\s*/, '');
}

/** Starts the server and waits until it takes connections. */
export async function startServer(options) {
  const { dir, bin, port } = options;
  const child = launch(options);
  let over = false;
  child.once('exit', () => (over = true)).once('error', () => (over = true));
  const until = Date.now() + 60_000;
  while (!over && Date.now() < until) {
    const { code } = await run(join(bin, 'pg_isready'), ['-q', '-h', '127.0.0.1', '-p', String(port)]);
    if (code === 0 && !over) return child;
    await sleep(50);
  }
  child.kill('SIGINT');
  throw new Trouble(
    `PostgreSQL did not start: ${complaint(dir) || 'see'} (log: ${join(dir, 'postgres.log')}).`,
  );
}
