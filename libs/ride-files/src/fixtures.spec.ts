import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { FixtureCase } from '../fixtures/case';
import { notOkCases } from '../fixtures/not-ok-cases';
import { okCases } from '../fixtures/ok-cases';
import { readWholeRideFile } from './index';

const root = join(__dirname, '../fixtures');

describe.each([
  ['ok', okCases],
  ['not-ok', notOkCases],
] as const)('every file in fixtures/%s', (folder, cases) => {
  const files = readdirSync(join(root, folder));

  it('was written by the generator as it is now', () => {
    expect(files.sort()).toEqual(cases.map(({ file }) => file).sort());
    for (const { file, bytes } of cases)
      expect([file, readBytes(folder, file).equals(bytes)]).toEqual([file, true]);
  });

  it.each(files)('%s', async (file) => {
    const known = cases.find((one) => one.file === file);
    expect(known).toBeDefined();
    await expectCase(known as FixtureCase, readBytes(folder, file));
  });
});

const readBytes = (folder: string, file: string) => readFileSync(join(root, folder, file));

async function expectCase(known: FixtureCase, bytes: Uint8Array): Promise<void> {
  const results = await readWholeRideFile(known.file, bytes);
  expect(results.map(({ outcome }) => outcome)).toEqual(known.outcomes);
  for (const { message } of results) expect(message).toMatch(/^[A-Z“\d].*[.?]$/);
  const rides = results.flatMap(({ outcome, ride }) => (outcome === 'ride' && ride ? [ride] : []));
  expect(rides).toHaveLength(known.rides.length);
  for (const [i, { distanceM, ...truth }] of known.rides.entries()) {
    expect(rides[i]).toMatchObject(truth);
    expect(Math.abs((rides[i]?.distanceM ?? 0) - distanceM)).toBeLessThanOrEqual(
      Math.max(1, 0.001 * distanceM),
    );
  }
  if (known.says) expect(results.find(({ outcome }) => outcome !== 'ride')?.message).toContain(known.says);
}
