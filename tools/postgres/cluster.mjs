import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { endChild } from '../process/bound-child.mjs';
import { claimFolder } from '../process/folder-lock.mjs';
import { Trouble } from '../process/trouble.mjs';
import { binaries } from './binaries.mjs';
import { createCluster } from './create.mjs';
import { identityFor } from './identity.mjs';
import { waitForLeftover } from './leftover.mjs';
import { readPasswords } from './passwords.mjs';
import { databaseUrls, ensureRoles } from './roles.mjs';
import { startServer } from './server.mjs';

function claim(dir) {
  mkdirSync(dir, { recursive: true });
  const lock = claimFolder(dir);
  if (lock.heldBy) {
    throw new Trouble(
      `${dir} is in use by another Halfpitch (process ${lock.heldBy}): stop it first or choose another DATA_DIR.`,
    );
  }
  return lock;
}

async function startClaimed({ dir, port, throwAway }) {
  const data = join(dir, 'postgres');
  await waitForLeftover(data);
  if (throwAway) rmSync(data, { recursive: true, force: true });
  const isNew = !existsSync(join(data, 'PG_VERSION'));
  const bin = binaries(isNew ? undefined : readFileSync(join(data, 'PG_VERSION'), 'utf8').trim());
  const identity = identityFor(dir);
  if (isNew) await createCluster({ dir, bin, identity, throwAway });
  const passwords = readPasswords(dir);
  const child = await startServer({ dir, bin, port, identity, throwAway });
  const stop = () => endChild(child, { signal: 'SIGINT', patienceMs: 30_000, lastResort: 'SIGQUIT' });
  try {
    await ensureRoles({ bin, port, passwords });
  } catch (error) {
    await stop();
    throw error;
  }
  return { child, stop, urls: databaseUrls(port, passwords), isNew };
}

/**
 * Starts a PostgreSQL cluster of our own in `dir`, made when it is missing. `throwAway` begins anew
 * each time, trades safety for speed and removes the data when stopped.
 * @returns {Promise<{ child: import('node:child_process').ChildProcess, isNew: boolean,
 *   urls: { app: string, owner: string, admin: string }, stop(): Promise<void> }>}
 */
export async function startCluster({ dir: folder, port, throwAway = false }) {
  const dir = resolve(folder);
  const lock = claim(dir);
  try {
    const cluster = await startClaimed({ dir, port, throwAway });
    const stop = async () => {
      await cluster.stop();
      if (throwAway) rmSync(join(dir, 'postgres'), { recursive: true, force: true });
      lock.release();
    };
    return { ...cluster, stop };
  } catch (error) {
    lock.release();
    throw error;
  }
}
