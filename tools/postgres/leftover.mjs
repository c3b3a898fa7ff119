import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { Trouble } from '../process/trouble.mjs';

function livePostmaster(data) {
  const file = join(data, 'postmaster.pid');
  if (!existsSync(file)) return undefined;
  const pid = Number(readFileSync(file, 'utf8').split('\n')[0]);
  try {
    return readFileSync(`/proc/${pid}/comm`, 'utf8').startsWith('postgres') ? pid : undefined;
  } catch {
    return undefined;
  }
}

/** A server whose launcher was just killed is still shutting down: waits until it has. */
export async function waitForLeftover(data, patienceMs = 20_000) {
  const until = Date.now() + patienceMs;
  let pid = livePostmaster(data);
  while (pid !== undefined && Date.now() < until) {
    await sleep(100);
    pid = livePostmaster(data);
  }
  if (pid !== undefined)
    throw new Trouble(`Another PostgreSQL server (process ${pid}) is using ${data}: stop it first.`);
}
