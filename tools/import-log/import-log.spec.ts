import { execFile } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createServer, Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

const dir = mkdtempSync(join(tmpdir(), 'halfpitch-import-'));
const file = join(dir, 'log.csv');
writeFileSync(file, 'date,distance_km\n2026-05-01,12\n');
afterAll(() => rmSync(dir, { recursive: true }));

const run = (...args: string[]) =>
  new Promise<{ code: number; out: string; err: string }>((resolve) => {
    const env = { PATH: process.env.PATH };
    execFile(process.execPath, [join(__dirname, 'import-log.mjs'), ...args], { env }, (error, out, err) =>
      resolve({ code: Number(error?.code ?? 0), out, err }),
    );
  });
const who = ['--email', 'a@b.example', '--password', 'secret'];

/** The address of something that answers everything with one refusal. */
async function refusing(status: number, detail: string): Promise<{ url: string; server: Server }> {
  const server = createServer((request, response) => {
    request.resume();
    response
      .writeHead(status, { 'content-type': 'application/problem+json' })
      .end(JSON.stringify({ detail }));
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  return { url: `http://127.0.0.1:${(server.address() as AddressInfo).port}`, server };
}

it('says how it is called', async () => {
  for (const args of [[], ['--chain', 'x'], ['--nonsense', file]]) {
    const { code, err } = await run(...args);
    expect(code).toBe(1);
    expect(err).toContain('npm run import-log -- --chain ID FILE');
  }
});

it('passes on in what words the server refuses', async () => {
  const { url, server } = await refusing(401, 'That e-mail address and password do not go together.');
  const { code, err } = await run('--chain', 'x', file, '--url', url, ...who);
  server.close();
  expect([code, err]).toEqual([1, 'That e-mail address and password do not go together.\n']);
  const gone = await run('--chain', 'x', file, '--url', url, ...who);
  expect(gone).toMatchObject({
    code: 1,
    err: expect.stringContaining('Nothing answers at http://127.0.0.1:'),
  });
});
