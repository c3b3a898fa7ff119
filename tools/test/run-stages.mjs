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

const notRun = ({ name }, lacking) => ({
  name,
  seconds: 0,
  passed: 0,
  failed: 1,
  skipped: 0,
  note: `not run: ${lacking.name} failed`,
});

function tell({ name, passed, failed, seconds, log }) {
  console.log(`${name}: ${passed} passed, ${failed} failed (${seconds.toFixed(1)} s)`);
  if (failed > 0 && log) console.log(endOf(log));
}

/** Stages that go alongside each other, in their order. */
function batches(stages) {
  const all = [];
  for (const stage of stages) {
    if (stage.alongside && all.length > 0) all.at(-1).push(stage);
    else all.push([stage]);
  }
  return all;
}

/** Runs the stages in order; a failure stops none but those that need what failed. */
export async function runStages(stages, context, life) {
  const results = [];
  const runOne = async (stage) => {
    const lacking = results.find(({ name, failed }) => failed > 0 && stage.needs?.includes(name));
    const result = lacking ? notRun(stage, lacking) : await runStage(stage, context);
    if (!life.asked) tell(result);
    return result;
  };
  for (const batch of batches(stages)) {
    life.check();
    results.push(...(await Promise.all(batch.map(runOne))));
  }
  life.check();
  return results;
}
