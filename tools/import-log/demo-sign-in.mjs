import { join } from 'node:path';
import { lastLine, run } from '../process/run.mjs';
import { Trouble } from '../process/trouble.mjs';

const DEMO = join(import.meta.dirname, '../../dist/apps/api/apps/api/src/cli/demo.js');

/** The sign-in of the demo's owner, as npm start prints it. */
export async function demoOwner() {
  const { code, stdout } = await run(process.execPath, [DEMO, '--sign-ins'], { env: process.env });
  const owner = code === 0 && JSON.parse(lastLine(stdout)).find(({ role }) => role === 'owner');
  if (!owner) throw new Trouble('Say who signs in: --email and --password.');
  return owner;
}
