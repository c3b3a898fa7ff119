import { spawnSync } from 'node:child_process';
import { chownSync } from 'node:fs';
import { userInfo } from 'node:os';
import { Trouble } from '../process/trouble.mjs';

function numberOf(option) {
  const { status, stdout } = spawnSync('id', [option, 'postgres'], { encoding: 'utf8' });
  if (status !== 0)
    throw new Trouble("The system user 'postgres' is missing: reinstall Debian's postgresql-common.");
  return Number(stdout);
}

const become = ['--reuid', 'postgres', '--regid', 'postgres', '--init-groups'];
const passFolders = ['--inh-caps', '+dac_override', '--ambient-caps', '+dac_override'];

/**
 * Who runs the server for this folder. PostgreSQL refuses to run as root, so root hands it to the
 * system user `postgres`, with leave to pass folders that are closed to that user (a checkout under
 * /root, say). Anyone else runs it as himself.
 * @returns {{ privileges: string[], own(path: string): void }} options of setpriv(1); how to hand over a file
 */
export function identityFor(dir) {
  if (userInfo().uid !== 0) return { privileges: [], own: () => undefined };
  const [uid, gid] = [numberOf('-u'), numberOf('-g')];
  const reaches = spawnSync('setpriv', [...become, '--', 'test', '-x', dir]).status === 0;
  return {
    privileges: reaches ? become : [...become, ...passFolders],
    own: (path) => chownSync(path, uid, gid),
  };
}
