import { zipSync } from 'fflate';
import { gpx } from '../fixtures/gpx';
import { fitActivity } from '../fixtures/fit';
import { defaultLimits, readWholeRideFile } from './index';

const MB = 1024 * 1024;

/** A track of a million points, ten metres and two seconds apart, written straight into bytes. */
function millionPoints(): Uint8Array {
  const start = Date.parse('2025-05-03T00:00:00Z');
  const blocks: Buffer[] = [];
  for (let block = 0; block < 1000; block += 1) {
    const points = Array.from({ length: 1000 }, (_, i) => {
      const at = block * 1000 + i;
      const lat = ((at % 2 === 0 ? 0 : 10) * 180) / (6_371_008.8 * Math.PI);
      return `<trkpt lat="${lat.toFixed(9)}" lon="-30"><time>${new Date(start + at * 2000).toISOString()}</time></trkpt>`;
    });
    blocks.push(Buffer.from(points.join('')));
  }
  const [head = '', tail = ''] = gpx('<trk><trkseg>|</trkseg></trk>').split('|');
  return Buffer.concat([Buffer.from(head), ...blocks, Buffer.from(tail)]);
}

it('measures a million-point track in bounded memory while other work goes on', async () => {
  const bytes = millionPoints();
  globalThis.gc?.();
  const before = process.memoryUsage().heapUsed;
  let peak = 0;
  let turns = 0;
  const watch = setInterval(() => {
    turns += 1;
    peak = Math.max(peak, process.memoryUsage().heapUsed);
  }, 20);
  const [result] = await readWholeRideFile('long.gpx', bytes);
  clearInterval(watch);
  expect(result).toMatchObject({ outcome: 'ride', ride: { elapsedS: 1_999_998 } });
  expect(result?.ride?.distanceM).toBeCloseTo(9_999_990, -3);
  expect(turns).toBeGreaterThan(10);
  expect(peak - before).toBeLessThan(200 * MB);
}, 120_000);

it.each([
  ['one file of zeros', { 'zeros.csv': new Uint8Array(64 * MB) }],
  [
    'many files',
    Object.fromEntries(
      Array.from({ length: defaultLimits.archiveEntries + 1 }, (_, i) => [`${i}.gpx`, new Uint8Array()]),
    ),
  ],
])('refuses an archive bomb: %s', async (_, files) => {
  const results = await readWholeRideFile('bomb.zip', zipSync(files));
  expect(results).toHaveLength(1);
  expect(results[0]).toMatchObject({
    outcome: 'unreadable',
    message: expect.stringMatching(/unpacks to far more|holds more than/),
  });
});

it.each([10, 500_000])(
  'refuses a file for which the directory claims %i bytes, and keeps the rest of the batch',
  async (claimed) => {
    const ride = fitActivity([
      { start: '2025-05-03T08:00:00Z', sport: 'cycling', metres: 9000, timerS: 1800, elapsedS: 1800 },
    ]);
    const bytes = zipSync({
      'lies.gpx': new TextEncoder().encode(gpx(' '.repeat(100_000))),
      'ride.fit': ride,
    });
    const directory = Buffer.from(bytes).indexOf(Buffer.from([0x50, 0x4b, 1, 2]));
    new DataView(bytes.buffer, bytes.byteOffset).setUint32(directory + 24, claimed, true);
    const results = await readWholeRideFile('batch.zip', bytes);
    expect(results.map(({ file, outcome }) => [file, outcome])).toEqual([
      ['batch.zip/lies.gpx', 'unreadable'],
      ['batch.zip/ride.fit', 'ride'],
    ]);
    expect(results[0]?.message).toMatch(/damaged|breaks off/);
  },
);

it('stops unpacking a gzip bomb at the limit', async () => {
  const { gzipSync } = await import('node:zlib');
  const bomb = gzipSync(new Uint8Array(64 * MB));
  const limits = { xmlBytes: 8 * MB, fitBytes: 8 * MB, csvBytes: 8 * MB };
  const [result] = await readWholeRideFile('bomb.csv.gz', bomb, { limits });
  expect(result).toMatchObject({
    outcome: 'unreadable',
    message: expect.stringContaining('unpacks to far more'),
  });
});

it.each(['ride.gpx', 'ride.csv'])('refuses a file beyond the size limit: %s', async (name) => {
  const start = name.endsWith('gpx') ? '<gpx>' : 'date,km\n';
  const [result] = await readWholeRideFile(name, Buffer.from(start.padEnd(2 * MB, '9')), {
    limits: { xmlBytes: MB, csvBytes: MB },
  });
  expect(result).toMatchObject({
    outcome: 'unreadable',
    message: 'The file is larger than the 1 MB that can be read: split it and try again.',
  });
});

it('does not hang on a tag with endless attributes or a cell without an end', async () => {
  const attributes = Array.from({ length: 300_000 }, (_, i) => `a${i}="1"`).join(' ');
  const [tag] = await readWholeRideFile('tag.gpx', Buffer.from(`<gpx ${attributes}/>`));
  expect(tag?.message).toContain('too many attributes');
  const [cell] = await readWholeRideFile('cell.csv', Buffer.from(`date,km\n"${'x'.repeat(8 * MB)}`));
  expect(cell?.outcome).toBe('unreadable');
});
