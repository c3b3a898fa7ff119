import { spawnSync } from 'node:child_process';
import { join } from 'node:path';

const root = join(__dirname, '../..');
const readRides = (...folder: string[]) =>
  spawnSync(process.execPath, ['--import', 'tsx', 'tools/read-rides/main.ts', ...folder], {
    cwd: root,
    encoding: 'utf8',
  });

const lines = (folder: string) =>
  readRides(folder)
    .stdout.trim()
    .split('\n')
    .map((line) => JSON.parse(line) as Record<string, unknown>);

it('prints one line for each file, rides with their figures', () => {
  const told = lines('libs/ride-files/fixtures/ok');
  expect(told.every(({ outcome }) => outcome === 'ride')).toBe(true);
  expect(told.find(({ file }) => file === 'three-sports.fit')).toEqual({
    file: 'three-sports.fit',
    outcome: 'ride',
    date: '2025-05-03',
    distanceM: 40_000,
    movingS: 4000,
    elapsedS: 4100,
    message: 'A ride of 40.0 km on 2025-05-03. 2 more were left out.',
  });
  expect(told.find(({ file }) => file === 'batch.zip')?.message).toBe('2 rides, 54.2 km in all.');
});

it('prints a sentence for each file that gives no ride', () => {
  const told = lines('libs/ride-files/fixtures/not-ok');
  expect(told.every(({ outcome, message }) => outcome !== 'ride' && String(message).length > 10)).toBe(true);
});

it('says what is missing when no folder is given', () => {
  const { status, stderr } = readRides();
  expect(status).toBe(1);
  expect(stderr.trim()).toBe('Give the folder to read: npm run -s read-rides -- DIR');
});
