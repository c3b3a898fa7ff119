import { openAsBlob } from 'node:fs';
import { basename } from 'node:path';
import { setTimeout } from 'node:timers/promises';
import { Trouble } from '../process/trouble.mjs';
import { progressBar } from './bar.mjs';
import { demoOwner } from './demo-sign-in.mjs';
import { readOptions } from './options.mjs';
import { signIn } from './server.mjs';

/** Sends one file and waits until the server has taken it in. */
async function importFile(server, chainId, file) {
  const blob = await openAsBlob(file).catch(() => {
    throw new Trouble(`${file} cannot be opened.`);
  });
  const bar = progressBar(process.stdout);
  let state = await server.upload({ chainId, file: new File([blob], basename(file)) });
  while (state.state === 'waiting' || state.state === 'running') {
    bar.draw(state);
    await setTimeout(100);
    state = await server.read(state.id);
  }
  bar.draw(state);
  bar.end();
  return state;
}

function report({ state, added, alreadyThere, refused, problems, message }) {
  if (state === 'failed') return console.log(`  Not taken in: ${message}`);
  console.log(`  ${added} added, ${alreadyThere} already there, ${refused} refused`);
  for (const { line, message: wrong } of problems)
    console.log(line === null ? `  ${wrong}` : `  line ${line}: ${wrong}`);
  if (refused > problems.length) console.log(`  … and ${refused - problems.length} more`);
}

/** Takes ride logs into a running Halfpitch: npm run import-log -- --chain ID FILE… */
async function main() {
  const { chain, files, url, ...asked } = readOptions(process.argv.slice(2), process.env);
  const { email, password } = asked.email && asked.password ? asked : await demoOwner();
  const server = await signIn({ url, email, password });
  for (const file of files) {
    console.log(file);
    const state = await importFile(server, chain, file);
    report(state);
    if (state.state === 'failed') process.exitCode = 1;
  }
  await server.signOut();
}

main().catch((error) => {
  console.error(error instanceof Trouble ? error.message : error);
  process.exitCode = 1;
});
