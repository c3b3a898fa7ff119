import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Trouble } from '../process/trouble.mjs';

const fileIn = (dir) => join(dir, 'postgres-passwords.json');
const fresh = () => randomBytes(24).toString('base64url');

/** Makes new passwords for a new cluster and keeps them beside it, for its owner's eyes only. */
export function makePasswords(dir) {
  const passwords = { admin: fresh(), owner: fresh(), app: fresh() };
  rmSync(fileIn(dir), { force: true });
  writeFileSync(fileIn(dir), JSON.stringify(passwords), { mode: 0o600 });
  return passwords;
}

/** The passwords of the cluster in this folder. */
export function readPasswords(dir) {
  if (!existsSync(fileIn(dir))) {
    throw new Trouble(
      `${fileIn(dir)} is missing, so the database in ${dir} cannot be opened: put it back or choose another DATA_DIR.`,
    );
  }
  return JSON.parse(readFileSync(fileIn(dir), 'utf8'));
}
