import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { run } from '../process/run.mjs';
import { Trouble } from '../process/trouble.mjs';

const packagesIn = (file) => JSON.parse(readFileSync(file, 'utf8')).packages;

/** Whether node_modules holds exactly what the lockfile says, by npm's own record of what it installed. */
export function packagesAreFresh(root) {
  const record = join(root, 'node_modules', '.package-lock.json');
  if (!existsSync(record)) return false;
  const { '': _self, ...wanted } = packagesIn(join(root, 'package-lock.json'));
  const installed = packagesIn(record);
  const same = ([path, { version, optional }]) =>
    path in installed ? installed[path].version === version : optional === true;
  return Object.entries(wanted).every(same) && Object.keys(installed).every((path) => path in wanted);
}

/** Installs the npm packages of the lockfile when they are missing or stale. */
export async function ensurePackages(root, { log } = {}) {
  if (packagesAreFresh(root)) return 'up to date';
  const options = ['--include=dev', '--no-audit', '--no-fund', '--no-progress', '--loglevel=error'];
  const { code, stderr } = await run('npm', ['ci', ...options], { cwd: root, log });
  if (code === 0) return 'installed';
  const errors = stderr
    .split('\n')
    .filter(
      (line) => /^npm (error|ERR!)/.test(line) && !/ (code|errno|syscall|type) |complete log/.test(line),
    );
  const reason = errors[0]?.replace(/^npm (error|ERR!)\s*/, '') ?? stderr.trim();
  throw new Trouble(`Could not install the npm packages (${reason}); see ${log} and start again.`);
}
