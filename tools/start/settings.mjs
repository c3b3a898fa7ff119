import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { freePorts, isFree } from '../process/ports.mjs';
import { Trouble } from '../process/trouble.mjs';

/** Where to listen and where to keep things, from PORT and DATA_DIR. */
export function readSettings(root, { PORT = '4190', DATA_DIR = '.data' }) {
  const port = Number(PORT);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new Trouble(`PORT is "${PORT}": give a whole number from 1 to 65535.`);
  }
  return { port, dataDir: resolve(root, DATA_DIR) };
}

/** The asked port, which must be free, and the ones after it or any free ones for the parts behind it. */
export async function choosePorts(port) {
  if (!(await isFree(port))) {
    throw new Trouble(
      `Port ${port} is taken or not allowed: stop what uses it, or choose another, for example PORT=${port < 65_500 ? port + 10 : 4190} npm start.`,
    );
  }
  const [mailbox, smtp, postgres] = await freePorts(port + 1, port + 2, port + 3);
  return { http: port, mailbox, smtp, postgres };
}

/** Signs the sessions: made once and kept beside the data. */
export function sessionSecret(dataDir) {
  const file = join(dataDir, 'session-secret');
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('base64url'), { mode: 0o600 });
  return readFileSync(file, 'utf8');
}
