import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { claimFolder } from '../process/folder-lock.mjs';
import { ensureBuild } from './build.mjs';
import { ensurePackages } from './packages.mjs';

/** One at a time: a start and a test run on a fresh clone must not install over each other. */
async function inTurn(root, work) {
  const dir = join(root, 'dist');
  mkdirSync(dir, { recursive: true });
  let turn = claimFolder(dir);
  while (turn.heldBy) {
    await sleep(300);
    turn = claimFolder(dir);
  }
  try {
    return await work();
  } finally {
    turn.release();
  }
}

/** Installs the npm packages when needed. */
export const preparePackages = (root, log) => inTurn(root, () => ensurePackages(root, { log }));

/** Builds the product when needed. */
export const prepareBuild = (root, options) => inTurn(root, () => ensureBuild(root, options));
