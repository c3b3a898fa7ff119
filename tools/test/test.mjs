import { mkdirSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { parseArgs } from 'node:util';
import { startCluster } from '../postgres/cluster.mjs';
import { claimFolder } from '../process/folder-lock.mjs';
import { freePorts } from '../process/ports.mjs';
import { Trouble } from '../process/trouble.mjs';
import { Lifetime } from '../start/lifetime.mjs';
import { preparePackages } from '../start/prepare.mjs';
import { ensureEquipment } from './equipment.mjs';
import { table, totals } from './report.mjs';
import { runStages } from './run-stages.mjs';
import { chosenStages, groups } from './stages.mjs';

const root = resolve(fileURLToPath(import.meta.url), '../../..');
const home = join(root, '.test');
const folders = { logs: join(home, 'logs'), reports: join(home, 'reports'), dist: join(home, 'dist') };

function readOnly() {
  const { only } = parseArgs({ options: { only: { type: 'string' } } }).values;
  if (only === undefined || groups.includes(only)) return only;
  throw new Trouble(`--only is one of ${groups.join(', ')}.`);
}

function claimTests(life) {
  mkdirSync(folders.logs, { recursive: true });
  const claim = claimFolder(home);
  if (claim.heldBy)
    throw new Trouble(`Another npm test (process ${claim.heldBy}) runs in this checkout: let it end first.`);
  life.add(() => claim.release());
}

async function testDatabase(stages, life) {
  if (!stages.some(({ needs }) => needs?.includes('database'))) return undefined;
  const [port] = await freePorts(0);
  const cluster = await startCluster({ dir: join(home, 'database'), port, throwAway: true });
  life.add(cluster.stop);
  return cluster.urls;
}

/** Everything that shows whether the product is right. */
async function test(life) {
  const stages = chosenStages(readOnly());
  claimTests(life);
  const log = join(folders.logs, 'install.log');
  await ensureEquipment(stages, log);
  await preparePackages(root, log);
  life.check();
  const context = { root, ...folders, databaseUrls: await testDatabase(stages, life) };
  return runStages(stages, context, life);
}

const life = new Lifetime();
life.listen();
let results = [];
try {
  results = await test(life);
  console.log(`\n${table(results)}\n`);
} catch (error) {
  results = [{ passed: 0, failed: 1 }];
  if (!life.asked) console.error(error instanceof Trouble ? error.message : error);
}
await life.end();
const { passed, failed } = totals(results);
process.exitCode = failed > 0 ? 1 : 0;
console.log(`${passed} passed, ${failed} failed`);
process.exit();
