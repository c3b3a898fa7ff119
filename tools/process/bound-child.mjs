import { spawn } from 'node:child_process';

/**
 * Starts a program that cannot outlive this process: the kernel sends it `deathSignal` when we
 * end, even by kill -9. It gets a session of its own, so that Ctrl-C in the terminal reaches only us
 * and we stop things in their order.
 * `privileges` are further options of setpriv(1), such as the user to become.
 */
export function spawnBound(command, args, { deathSignal = 'TERM', privileges = [], ...options } = {}) {
  const setpriv = ['--pdeathsig', deathSignal, ...privileges, '--', command, ...args];
  return spawn('setpriv', setpriv, { detached: true, stdio: ['ignore', 'pipe', 'pipe'], ...options });
}

/** Resolves with how the child ended: `{ code, signal }`, or `{ error }` when it could not start. */
export function ended(child) {
  if (child.exitCode !== null || child.signalCode !== null) {
    return Promise.resolve({ code: child.exitCode, signal: child.signalCode });
  }
  return new Promise((resolve) => {
    child.once('error', (error) => resolve({ code: null, signal: null, error }));
    child.once('exit', (code, signal) => resolve({ code, signal }));
  });
}

/** Asks the child to end, waits, and resorts to `lastResort` after `patienceMs`. */
export async function endChild(
  child,
  { signal = 'SIGTERM', patienceMs = 15_000, lastResort = 'SIGKILL' } = {},
) {
  const end = ended(child);
  child.kill(signal);
  const timer = setTimeout(() => child.kill(lastResort), patienceMs);
  const result = await end;
  clearTimeout(timer);
  return result;
}
