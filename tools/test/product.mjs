import { mkdir } from 'node:fs/promises';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { freePorts } from '../process/ports.mjs';
import { Lifetime } from '../start/lifetime.mjs';
import { prepareBuild } from '../start/prepare.mjs';
import { runProduct } from '../start/product.mjs';
import { silently } from '../start/stage.mjs';

const root = resolve(fileURLToPath(import.meta.url), '../../..');

async function anyPorts() {
  const [http, mailbox, smtp, postgres] = await freePorts(0, 0, 0, 0);
  return { http, mailbox, smtp, postgres };
}

/** So that every screen has today's figures, as after a start without test hooks. */
async function workThroughTheNight(baseUrl) {
  const answer = await fetch(`${baseUrl}/api/test/clock`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json', Origin: baseUrl },
    body: JSON.stringify({ days: 0 }),
  });
  if (!answer.ok) throw new Error(`The night's work was refused: ${answer.status}.`);
}

/**
 * Starts the built product for a test: on data of its own that begin anew each time, with the demo and the
 * test hooks, built first when stale. It ends with `stop()`, at the latest with this process.
 */
export async function startProduct({ dir = join(root, '.test', 'product'), ports, dist } = {}) {
  const out = dist ?? process.env.TEST_DIST ?? join(root, 'dist');
  const life = new Lifetime();
  try {
    await mkdir(dir, { recursive: true });
    await prepareBuild(root, { out, log: join(dir, 'build.log') });
    const options = { root, dist: out, dir, ports: ports ?? (await anyPorts()), life, stage: silently };
    const product = await runProduct({ ...options, throwAway: true, testHooks: true });
    await workThroughTheNight(product.baseUrl);
    return { ...product, stop: () => life.end() };
  } catch (error) {
    await life.end();
    throw error;
  }
}
