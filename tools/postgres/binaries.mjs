import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { installDebianPackages } from '../process/apt.mjs';
import { Trouble } from '../process/trouble.mjs';

const root = '/usr/lib/postgresql';

function installedVersions() {
  if (!existsSync(root)) return [];
  const versions = readdirSync(root).filter((name) => existsSync(join(root, name, 'bin', 'postgres')));
  return versions.sort((a, b) => Number(b) - Number(a));
}

/** Whether Debian's PostgreSQL server is on this machine. */
export function hasPostgres() {
  return installedVersions().length > 0;
}

/** Installs Debian's PostgreSQL when there is none. The system's own cluster is never used. */
export async function ensurePostgres({ log } = {}) {
  if (hasPostgres()) return;
  await installDebianPackages(['postgresql'], { log });
  if (!hasPostgres()) throw new Trouble(`PostgreSQL was installed, but no server was found under ${root}.`);
}

/** Folder of the server's programs: of the wanted major version, otherwise of the newest one. */
export function binaries(wanted) {
  const versions = installedVersions();
  const version = wanted ?? versions[0];
  if (version && versions.includes(version)) return join(root, version, 'bin');
  throw new Trouble(
    wanted
      ? `The data folder was made by PostgreSQL ${wanted}, which is not installed: install postgresql-${wanted} or choose another DATA_DIR.`
      : 'PostgreSQL is not installed: install it with apt-get install postgresql.',
  );
}
