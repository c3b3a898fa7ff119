import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import { stripVTControlCharacters } from 'node:util';
import { lastLine, run } from '../process/run.mjs';
import { Trouble } from '../process/trouble.mjs';
import { sourcesHash } from './sources.mjs';

const apiConfig = 'apps/api/tsconfig.app.json';

/** Nest takes the output folder from the TypeScript configuration only, so another folder needs its own. */
function apiOptions(root, out) {
  if (out === join(root, 'dist')) return [];
  const file = `${out}.tsconfig.json`;
  const base = relative(join(out, '..'), join(root, apiConfig));
  writeFileSync(file, JSON.stringify({ extends: base, compilerOptions: { outDir: join(out, 'apps/api') } }));
  return ['--', '--path', relative(root, file)];
}

async function script(root, name, options, log) {
  const { code, stdout, stderr } = await run('npm', ['run', '--silent', name, ...options], {
    cwd: root,
    log,
  });
  if (code === 0) return;
  const output = stripVTControlCharacters(`${stderr}\n${stdout}`);
  const complaint = output.split('\n').find((line) => /error/i.test(line)) ?? lastLine(output);
  throw new Trouble(`The build failed in "${name}": ${complaint.trim()} (all of it in ${log}).`);
}

/** Builds the server and the web application into `out` unless it was built from these very sources. */
export async function ensureBuild(root, { out = join(root, 'dist'), log }) {
  const stamp = join(out, 'built-from');
  const hash = sourcesHash(root);
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === hash) return 'up to date';
  mkdirSync(out, { recursive: true });
  rmSync(stamp, { force: true });
  const web = ['--', '--outDir', join(out, 'apps/web'), '--emptyOutDir'];
  const both = [script(root, 'build:api', apiOptions(root, out), log), script(root, 'build:web', web, log)];
  const failed = (await Promise.allSettled(both)).find(({ status }) => status === 'rejected');
  if (failed) throw failed.reason;
  writeFileSync(stamp, hash);
  return 'built';
}
