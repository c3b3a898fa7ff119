import { existsSync, mkdirSync, statfsSync } from 'node:fs';
import { join } from 'node:path';
import { Trouble } from '../process/trouble.mjs';

const MB = 1_000_000;

/** The Node.js version that package.json asks for. */
export function checkNode(wanted, have = process.versions.node) {
  const [major, minor] = wanted.replace(/^>=/, '').split('.').map(Number);
  const [haveMajor, haveMinor] = have.split('.').map(Number);
  if (haveMajor > major || (haveMajor === major && haveMinor >= minor)) return;
  throw new Trouble(
    `Halfpitch needs Node.js ${major}.${minor} or newer, and this is ${have}: install a newer one.`,
  );
}

function checkSpace(dir, neededBytes) {
  const { bavail, bsize } = statfsSync(dir);
  const free = bavail * bsize;
  if (free >= neededBytes) return;
  const inMB = (bytes) => `${Math.round(bytes / MB)} MB`;
  throw new Trouble(
    `Not enough disk space for ${dir}: ${inMB(free)} free, ${inMB(neededBytes)} needed; make room and start again.`,
  );
}

/** Room for the packages and the build in the checkout, and for the database where its data goes. */
export function checkDisk({ root, dataDir }) {
  checkSpace(root, existsSync(join(root, 'node_modules')) ? 200 * MB : 1_500 * MB);
  try {
    mkdirSync(dataDir, { recursive: true });
  } catch (error) {
    throw new Trouble(
      `The data folder ${dataDir} cannot be made (${error.code}): choose another with DATA_DIR.`,
    );
  }
  checkSpace(dataDir, existsSync(join(dataDir, 'postgres')) ? 100 * MB : 500 * MB);
}
