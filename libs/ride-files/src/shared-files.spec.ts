import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { parse } from 'csv-parse/sync';
import {
  fingerprintAll,
  inspectCsv,
  readCsv,
  readWholeRideFile,
  sameRide,
  summariseFile,
  type FileRide,
} from './index';

/** Real files beside the checkout, where there are any; the tests of this file are skipped without them. */
const files = join(__dirname, '../../../../shared/ride-files');
const logs = join(__dirname, '../../../../shared/ridelogs/logs');

type Row = Record<
  'file' | 'kind' | 'start' | 'distance_m' | 'timer_s' | 'elapsed_s' | 'same_ride_group',
  string
>;

const manifest = existsSync(files)
  ? (parse(readFileSync(join(files, 'manifest.csv')), { columns: true }) as Row[])
  : [];
const close = (told: number | null, expected: string, share: number) => {
  if (expected !== '')
    expect(Math.abs((told ?? NaN) - Number(expected))).toBeLessThanOrEqual(
      Math.max(1, share * Number(expected)),
    );
};
const read = async (file: string) =>
  summariseFile(file, await readWholeRideFile(file, readFileSync(join(files, file))));
const kinds = (...wanted: string[]) => manifest.filter(({ kind }) => wanted.includes(kind));
const rideKinds = ['ride', 'track'];

(manifest.length > 0 ? describe : describe.skip)('real ride files', () => {
  it.each(kinds(...rideKinds))('$file: one $kind as its manifest says', async (row) => {
    const told = await read(row.file);
    close(told.distanceM, row.distance_m, row.kind === 'track' ? 0.02 : 0.01);
    expect(told.date).toBe(row.start.slice(0, 10));
    close(told.movingS, row.timer_s, 0.01);
    close(told.elapsedS, row.elapsed_s, 0.01);
    const moves = Number(row.distance_m) > 0 || row.kind === 'ride';
    const isRun = row.file === 'gpx-59.gpx';
    expect(told.outcome).toBe(isRun ? 'other-sport' : moves ? 'ride' : 'not-a-ride');
  });

  it.each(kinds('other sport', 'multisport'))('$file: $kind', async ({ file }) => {
    const told = await read(file);
    expect(told.outcome).toBe(file === 'fit-33.fit' ? 'ride' : 'other-sport');
    if (file === 'fit-33.fit') expect(told.distanceM).toBe(40_909);
  });

  it.each(kinds('untimed track'))('$file: measured, but without a day', async ({ file, distance_m }) => {
    const told = await read(file);
    expect(told).toMatchObject({ outcome: 'not-a-ride', date: null });
    close(told.distanceM, distance_m, 0.02);
  });

  it('knows the rides that are in the folder in several formats, and takes no others for one', async () => {
    const rides: { group: string; ride: FileRide }[] = [];
    for (const { file, same_ride_group } of kinds(...rideKinds)) {
      for (const { outcome, ride } of await readWholeRideFile(file, readFileSync(join(files, file)))) {
        if (outcome === 'ride' && ride) rides.push({ group: same_ride_group || file, ride });
      }
    }
    for (const [i, a] of rides.entries()) {
      for (const b of rides.slice(i + 1))
        expect([a.group, b.group, sameRide(a.ride, b.ride)]).toEqual([
          a.group,
          b.group,
          a.group === b.group && a.ride.date === b.ride.date,
        ]);
    }
  });

  it.each(manifest.filter(({ kind }) => /^no|^not/.test(kind)))('$file: $kind', async ({ file, kind }) => {
    expect((await read(file)).outcome).toBe(kind === 'no session' ? 'unreadable' : 'not-a-ride');
  });
});

(existsSync(logs) ? describe : describe.skip)('real ride logs', () => {
  it.each(existsSync(logs) ? readdirSync(logs) : [])('%s needs no question and doubles nothing', (file) => {
    const bytes = readFileSync(join(logs, file));
    expect(inspectCsv(bytes).questions).toEqual([]);
    const { rides, problems } = readCsv(bytes);
    expect(rides.length + problems.length).toBe(bytes.toString().trimEnd().split('\n').length - 1);
    expect(problems.filter(({ outcome }) => outcome !== 'not-a-ride')).toEqual([]);
    expect(new Set(fingerprintAll(rides)).size).toBe(rides.length);
  });
});
