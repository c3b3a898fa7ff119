import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join, relative } from 'node:path';

const files = ['package.json', 'package-lock.json', 'nest-cli.json', 'tsconfig.json', 'tsconfig.base.json'];
const folders = ['apps', 'libs'];
const notBuilt = /(^|\/)(e2e|test|node_modules)\/|\.(e2e-)?(spec|test)\.tsx?$/;

function* filesUnder(dir) {
  for (const entry of readdirSync(dir, { withFileTypes: true })) {
    const path = join(dir, entry.name);
    if (entry.isDirectory()) yield* filesUnder(path);
    else if (entry.isFile()) yield path;
  }
}

/** A fingerprint of everything that the build is made from: tests left out. */
export function sourcesHash(root) {
  const inFolders = folders
    .flatMap((folder) => [...filesUnder(join(root, folder))])
    .map((path) => relative(root, path));
  const hash = createHash('sha256');
  for (const path of [...files, ...inFolders].filter((name) => !notBuilt.test(name)).sort()) {
    hash
      .update(`${path}\0`)
      .update(readFileSync(join(root, path)))
      .update('\0');
  }
  return hash.digest('hex');
}
