import { execFile } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { BootedApp, bootApp, ownerOfNewWorkshop, PASSWORD } from './support/app';
import { daysAgo, newBike, newChain, newRider } from './support/scene';

const dir = mkdtempSync(join(tmpdir(), 'halfpitch-log-'));
let booted: BootedApp;

beforeAll(async () => {
  booted = await bootApp();
});
afterAll(async () => {
  await booted.close();
  rmSync(dir, { recursive: true });
});

const run = (...args: string[]) =>
  new Promise<string>((resolve, reject) => {
    const program = join(__dirname, '../../../tools/import-log/import-log.mjs');
    execFile(process.execPath, [program, ...args], (error, out, err) =>
      error ? reject(new Error(err)) : resolve(out),
    );
  });

it('takes a log of 1,940 rides in with one command, and again without doubling anything', async () => {
  const { browser, email } = await ownerOfNewWorkshop(booted, 'North Wheel');
  const rider = await newRider(browser, 'Rita Rider');
  const bike = await newBike(browser, rider.id);
  const chain = await newChain(browser, bike, { inServiceOn: daysAgo(2000) });
  const file = join(dir, 'log.csv');
  const lines = Array.from(
    { length: 1940 },
    (_, i) => `${daysAgo(1941 - i)},${(3 + (i % 400) / 10).toFixed(3)},`,
  );
  writeFileSync(file, ['date,distance_km,indoor', ...lines, ''].join('\n'));
  const args = [
    '--chain',
    chain.id,
    file,
    '--url',
    await booted.app.getUrl(),
    '--email',
    email,
    '--password',
    PASSWORD,
  ];
  expect(await run(...args)).toContain('1940 added, 0 already there, 0 refused');
  expect(await run(...args)).toContain('0 added, 1940 already there, 0 refused');
  const { body } = await browser.get('/api/rides').query({ chainId: chain.id, size: 1 }).expect(200);
  expect(body.total).toBe(1940);
});
