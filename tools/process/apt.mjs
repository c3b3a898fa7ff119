import { existsSync } from 'node:fs';
import { userInfo } from 'node:os';
import { run } from './run.mjs';
import { Trouble } from './trouble.mjs';

const isRoot = () => userInfo().uid === 0;

/** apt-get as root, through sudo when we are not root. Only a terminal can ask for a password. */
async function aptGet(args, log) {
  const options = ['-y', '-q', '-o', 'DPkg::Lock::Timeout=300', ...args];
  const settings = ['DEBIAN_FRONTEND=noninteractive', 'LC_ALL=C.UTF-8'];
  if (isRoot()) return run('env', [...settings, 'apt-get', ...options], { log });
  const ask = process.stdin.isTTY ? [] : ['-n'];
  const stdio = process.stdin.isTTY ? { stdio: ['inherit', 'pipe', 'pipe'], detached: false } : {};
  return run('sudo', [...ask, 'env', ...settings, 'apt-get', ...options], { log, ...stdio });
}

const telling = /^(E:|sudo:)/;

/** Installs packages of Debian, or says in one sentence why it could not. */
export async function installDebianPackages(names, { log } = {}) {
  const list = names.join(' ');
  if (!isRoot() && !existsSync('/usr/bin/sudo')) {
    throw new Trouble(
      `Halfpitch needs Debian's ${list}, and without sudo only root can install it: as root, apt-get install ${list}.`,
    );
  }
  const update = await aptGet(['update'], log);
  const install = await aptGet(['install', '--no-install-recommends', ...names], log);
  if (install.code === 0) return;
  const lines = `${update.stderr}\n${install.stderr}`.split('\n');
  const complaint = lines.find((line) => telling.test(line)) ?? `apt-get ended with ${install.code}`;
  const byHand = `${isRoot() ? '' : 'sudo '}apt-get install ${list}`;
  throw new Trouble(
    `Could not install ${list} from Debian's packages (${complaint}); install by hand with: ${byHand}.`,
  );
}
