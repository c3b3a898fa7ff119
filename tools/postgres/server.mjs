import { closeSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { ended, spawnBound } from '../process/bound-child.mjs';
import { openLog, stoppedSentence } from '../process/log-file.mjs';
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
  const log = openLog(join(dir, 'postgres.log'));
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

/** Starts the server and waits until it takes connections. */
export async function startServer(options) {
  const { dir, bin, port } = options;
  const child = launch(options);
  let end;
  void ended(child).then((how) => (end = how));
  const until = Date.now() + 60_000;
  while (!end && Date.now() < until) {
    const { code } = await run(join(bin, 'pg_isready'), ['-q', '-h', '127.0.0.1', '-p', String(port)]);
    if (code === 0 && !end) return child;
    await sleep(50);
  }
  const log = join(dir, 'postgres.log');
  if (end) throw new Trouble(stoppedSentence('PostgreSQL', end, log));
  child.kill('SIGINT');
  throw new Trouble(`PostgreSQL did not become ready within a minute (log: ${log}).`);
}
