import { appendFileSync } from 'node:fs';
import { spawnBound } from './bound-child.mjs';

const running = new Set();

/** Ends a command with the processes it started itself. */
function endGroup(child) {
  try {
    process.kill(-child.pid, 'SIGTERM');
  } catch {
    child.kill('SIGTERM');
  }
}

/**
 * Runs a command to its end. Its output is returned and, with `log`, appended to that file as it comes;
 * `onLine` sees each line of stdout; `giveUp`, asked every second, ends the command by saying yes.
 * @returns {Promise<{ code: number | null, stdout: string, stderr: string }>}
 */
export function run(command, args, { log, input, onLine, giveUp, ...options } = {}) {
  return new Promise((resolve) => {
    const stdin = input === undefined ? 'ignore' : 'pipe';
    const child = spawnBound(command, args, { stdio: [stdin, 'pipe', 'pipe'], ...options });
    running.add(child);
    const text = { stdout: '', stderr: '' };
    let partLine = '';
    const take = (name) => (chunk) => {
      text[name] += chunk;
      if (log) appendFileSync(log, chunk);
      if (name !== 'stdout' || !onLine) return;
      const lines = (partLine + chunk).split('\n');
      partLine = lines.pop();
      lines.forEach((line) => onLine(line));
    };
    child.stdout.setEncoding('utf8').on('data', take('stdout'));
    child.stderr.setEncoding('utf8').on('data', take('stderr'));
    if (input !== undefined) child.stdin.on('error', () => undefined).end(input);
    const asking = giveUp && setInterval(() => giveUp() && endGroup(child), 1_000);
    const settle = (code) => {
      clearInterval(asking);
      running.delete(child);
      resolve({ code, ...text });
    };
    child.once('error', (error) => {
      text.stderr += error.message;
      settle(null);
    });
    child.once('close', settle);
  });
}

/** Ends every command that `run` still waits for, with the processes it started itself. */
export function endRunning() {
  for (const child of running) endGroup(child);
}

/** The last line with something in it. */
export function lastLine(text) {
  return text.trim().split('\n').at(-1)?.trim() ?? '';
}

/** What a failed command had to say: its last line that names an error, otherwise its last line. */
export function complaintIn(text) {
  const naming = text.split('\n').findLast((line) => /error/i.test(line) && !/^\s+at /.test(line));
  return naming?.trim() ?? lastLine(text);
}
