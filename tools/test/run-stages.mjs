import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { Trouble } from '../process/trouble.mjs';
import { endOf } from './report.mjs';

async function runStage({ name, work }, context) {
  const log = join(context.logs, `${name}.log`);
  rmSync(log, { force: true });
  const since = performance.now();
  let counts;
  try {
    counts = await work({ ...context, log });
  } catch (error) {
    const note = error instanceof Trouble ? error.message : (error.stack ?? String(error));
    counts = { passed: 0, failed: 1, skipped: 0, note: note.split('\n')[0] };
  }
  return { name, seconds: (performance.now() - since) / 1000, log, ...counts };
}

/** Runs the stages one after the other; a failure stops none but those that need what failed. */
export async function runStages(stages, context, life) {
  const results = [];
  for (const stage of stages) {
    life.check();
    const lacking = results.find(({ name, failed }) => failed > 0 && stage.needs?.includes(name));
    const result = lacking
      ? {
          name: stage.name,
          seconds: 0,
          passed: 0,
          failed: 1,
          skipped: 0,
          note: `not run: ${lacking.name} failed`,
        }
      : await runStage(stage, context);
    life.check();
    results.push(result);
    console.log(
      `${stage.name}: ${result.passed} passed, ${result.failed} failed (${result.seconds.toFixed(1)} s)`,
    );
    if (result.failed > 0 && result.log) console.log(endOf(result.log));
  }
  return results;
}
