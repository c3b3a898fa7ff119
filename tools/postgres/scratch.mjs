import { parseArgs } from 'node:util';
import { ended } from '../process/bound-child.mjs';
import { freePorts } from '../process/ports.mjs';
import { Trouble } from '../process/trouble.mjs';
import { ensurePostgres } from './binaries.mjs';
import { startCluster } from './cluster.mjs';

/** A throw-away cluster in the foreground: node tools/postgres/scratch.mjs --dir DIR [--port N] */
async function main() {
  const { values } = parseArgs({ options: { port: { type: 'string' }, dir: { type: 'string' } } });
  if (!values.dir) throw new Trouble('Say where the data goes: --dir DIR.');
  await ensurePostgres();
  const [port] = values.port ? [Number(values.port)] : await freePorts(0);
  const cluster = await startCluster({ dir: values.dir, port, throwAway: true });
  let asked = false;
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, () => {
      if (!asked) void cluster.stop();
      asked = true;
    });
  }
  console.log(`DATABASE_URL=${cluster.urls.app}`);
  console.log(`DATABASE_OWNER_URL=${cluster.urls.owner}`);
  console.log(`DATABASE_ADMIN_URL=${cluster.urls.admin}`);
  await ended(cluster.child);
  if (!asked) throw new Trouble('PostgreSQL stopped unexpectedly.');
}

main().catch((error) => {
  console.error(error instanceof Trouble ? error.message : error);
  process.exitCode = 1;
});
