import { mkdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { complaintIn, run } from '../process/run.mjs';
import { Trouble } from '../process/trouble.mjs';
import { makePasswords } from './passwords.mjs';

/**
 * Makes a new cluster in `dir/postgres`. It is made beside and moved into place when whole, so that an
 * interrupted first start leaves nothing half made.
 */
export async function createCluster({ dir, bin, identity, throwAway }) {
  const unfinished = join(dir, 'postgres.unfinished');
  const passwordFile = join(dir, 'postgres.password');
  const passwords = makePasswords(dir);
  rmSync(unfinished, { recursive: true, force: true });
  rmSync(passwordFile, { force: true });
  mkdirSync(unfinished, { mode: 0o700 });
  writeFileSync(passwordFile, passwords.admin, { mode: 0o600 });
  [unfinished, passwordFile].forEach(identity.own);
  const options = ['-D', unfinished, '-U', 'postgres', '--auth=scram-sha-256', `--pwfile=${passwordFile}`];
  const { code, stderr } = await run(
    join(bin, 'initdb'),
    [...options, '--encoding=UTF8', '--locale=C.UTF-8', ...(throwAway ? ['--no-sync'] : [])],
    { privileges: identity.privileges, env: { PATH: process.env.PATH, TZ: 'UTC' }, cwd: '/' },
  );
  rmSync(passwordFile, { force: true });
  if (code !== 0)
    throw new Trouble(`PostgreSQL could not set up its data folder in ${dir}: ${complaintIn(stderr)}.`);
  renameSync(unfinished, join(dir, 'postgres'));
}
