import { closeSync, readFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { ensurePostgres, hasPostgres } from '../postgres/binaries.mjs';
import { openLog } from '../process/log-file.mjs';
import { Trouble } from '../process/trouble.mjs';
import { Lifetime } from './lifetime.mjs';
import { preparePackages, prepareBuild } from './prepare.mjs';
import { runProduct } from './product.mjs';
import { checkDisk, checkNode } from './requirements.mjs';
import { choosePorts, readSettings } from './settings.mjs';
import { signInLines } from './sign-ins.mjs';
import { createStages } from './stage.mjs';

const root = resolve(fileURLToPath(import.meta.url), '../../..');

/** From whatever state the checkout is in to the running product; returns when it is to end. */
async function start(life) {
  checkNode(JSON.parse(readFileSync(join(root, 'package.json'), 'utf8')).engines.node);
  const { port, dataDir } = readSettings(root, process.env);
  checkDisk({ root, dataDir });
  await choosePorts(port);
  const stage = createStages({ life });
  const log = join(dataDir, 'logs', 'install.log');
  closeSync(openLog(log));
  if (!hasPostgres()) await stage("PostgreSQL from Debian's packages", () => ensurePostgres({ log }));
  await stage('npm packages', () => preparePackages(root, log));
  await stage('Build', () => prepareBuild(root, { log }));
  const ports = await choosePorts(port);
  const product = await runProduct({ root, dist: join(root, 'dist'), dir: dataDir, ports, life, stage });
  life.check();
  console.log(signInLines(product.signIns).join('\n'));
  console.log(`Mailbox: ${product.mailboxUrl}`);
  console.log(`Halfpitch is ready at ${product.baseUrl}`);
  const trouble = await life.over;
  if (trouble) throw trouble;
}

const life = new Lifetime();
life.listen();
try {
  await start(life);
} catch (error) {
  process.exitCode = 1;
  if (!life.asked) console.error(error instanceof Trouble ? error.message : error);
}
await life.end();
process.exit();
