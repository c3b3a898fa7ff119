import { closeSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';
import { endChild, ended, spawnBound } from '../process/bound-child.mjs';
import { openLog, stoppedSentence } from '../process/log-file.mjs';
import { Trouble } from '../process/trouble.mjs';

const answers = async (url) => {
  try {
    return (await fetch(url, { signal: AbortSignal.timeout(5_000) })).ok;
  } catch {
    return false;
  }
};

/**
 * Starts one of our programs, waits until `readyUrl` answers well, and tells `life` should it end by itself.
 * Its output goes to `log`.
 */
export async function startService({ name, script, env, log, readyUrl, life, patienceMs = 120_000 }) {
  const output = openLog(log);
  const child = spawnBound(process.execPath, [script], { stdio: ['ignore', output, output], env });
  closeSync(output);
  let over = false;
  const end = ended(child).then((how) => {
    over = true;
    const trouble = new Trouble(stoppedSentence(name, how, log));
    life.crash(trouble);
    return trouble;
  });
  life.add(() => endChild(child));
  const until = Date.now() + patienceMs;
  while (!(await answers(readyUrl))) {
    if (over) throw await end;
    life.check();
    if (Date.now() > until)
      throw new Trouble(`${name} did not become ready in ${patienceMs / 1000} s (log: ${log}).`);
    await sleep(100);
  }
  if (over) throw await end;
}
