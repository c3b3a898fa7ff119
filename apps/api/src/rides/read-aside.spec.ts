import { gzipSync } from 'node:zlib';
import { readAside } from './read-aside';

const MB = 1024 * 1024;
const choices = { fileName: 'long.gpx.gz', otherSports: 'leave' as const, matching: null };
const calendar = { timeZone: 'UTC', today: '2026-12-01' };

/** A packed track of so many points, ten metres and a second apart. */
function track(points: number): Buffer {
  const start = Date.parse('2025-05-03T00:00:00Z');
  const written = Array.from({ length: points }, (_, i) => {
    const lat = i % 2 === 0 ? '0' : '0.0000899';
    return `<trkpt lat="${lat}" lon="-30"><time>${new Date(start + i * 1000).toISOString()}</time></trkpt>`;
  });
  const gpx =
    '<gpx version="1.1" creator="spec" xmlns="http://www.topografix.com/GPX/1/1"><trk><trkseg>|</trkseg></trk></gpx>';
  return gzipSync(gpx.replace('|', written.join('')));
}

/** The longest time in ms that nothing else had its turn while `work` went on. */
async function longestPause(work: () => Promise<unknown>): Promise<number> {
  let longest = 0;
  let last = performance.now();
  const watch = setInterval(() => {
    longest = Math.max(longest, performance.now() - last);
    last = performance.now();
  }, 5);
  await work();
  clearInterval(watch);
  return longest;
}

it('reads a long track while requests go on, in a thread', async () => {
  const packed = track(100_000);
  let rides: unknown;
  const pause = await longestPause(async () => ({ rides } = await readAside(choices, packed, calendar)));
  expect(rides).toMatchObject([{ date: '2025-05-03', format: 'gpx' }]);
  expect(pause).toBeLessThan(500);
});

it('says in a sentence that a file needs too much memory or time', async () => {
  const table = Buffer.from('date,distance_km\n'.padEnd(8 * MB, '2025-05-03,12.5\n'));
  const csv = { ...choices, fileName: 'log.csv' };
  const small = await readAside(csv, table, calendar, { heapMb: 24, timeMs: 60_000 });
  expect(small).toMatchObject({ rides: [], message: expect.stringContaining('needs more memory') });
  const short = await readAside(csv, table, calendar, { heapMb: 384, timeMs: 1 });
  expect(short).toMatchObject({ rides: [], message: expect.stringContaining('takes too long') });
});
