import { existsSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { startCluster } from '../postgres/cluster.mjs';
import { ended } from '../process/bound-child.mjs';
import { stoppedSentence } from '../process/log-file.mjs';
import { complaintIn, lastLine, run } from '../process/run.mjs';
import { Trouble } from '../process/trouble.mjs';

/** Starts the cluster as a part of the product: its end by itself is a crash. */
export async function startDatabase({ dir, port, throwAway, life }) {
  const cluster = await startCluster({ dir, port, throwAway });
  life.add(cluster.stop);
  void ended(cluster.child).then((how) => {
    life.crash(new Trouble(stoppedSentence('PostgreSQL', how, join(dir, 'postgres.log'))));
  });
  return cluster;
}

/** Runs one of the built command-line programs with the database owner's rights. */
async function program({ cli, name, args = [], env, dir, onLine }) {
  const log = join(dir, 'logs', `${name}.log`);
  const { code, stdout, stderr } = await run(process.execPath, [join(cli, `${name}.js`), ...args], {
    env,
    log,
    onLine,
  });
  if (code !== 0)
    throw new Trouble(`${name}.js failed: ${complaintIn(stderr) || lastLine(stdout)} (log: ${log}).`);
  return stdout;
}

export const migrate = (context) => program({ ...context, name: 'migrate' });

/** Loads the demo into a new cluster, or into one whose first start was interrupted before it was loaded. */
export async function loadDemo({ isNew, ...context }) {
  const done = join(context.dir, 'demo-loaded');
  if (!isNew && existsSync(done)) return 'there already';
  rmSync(done, { force: true });
  await program({ ...context, name: 'demo' });
  writeFileSync(done, '');
  return 'loaded';
}

/** The demo's sign-ins: `[{ email, password, role, … }]`. */
export async function demoSignIns(context) {
  return JSON.parse(lastLine(await program({ ...context, name: 'demo', args: ['--sign-ins'] })));
}
