import type { CsvMatching } from '@halfpitch/ride-files';
import { Choices, readRides } from './read-rides';

const read = (fileName: string, text: string, choices: Partial<Choices> = {}) =>
  readRides({ fileName, otherSports: 'leave', matching: null, ...choices }, Buffer.from(text), {
    timeZone: 'UTC',
    today: '2026-12-01',
  });

describe('a file on its way in', () => {
  it('gives rides with keys, and problems with their lines', async () => {
    const { rides, problems } = await read(
      'log.csv',
      'date,distance_km\n2026-05-01,12.5\n2026-05-01,12.5\n2027-01-01,3\n1970-05-01,3\n2026-05-02,far\n',
    );
    expect(rides.map(({ date, distanceM, format }) => [date, distanceM, format])).toEqual([
      ['2026-05-01', 12_500, 'csv'],
      ['2026-05-01', 12_500, 'csv'],
    ]);
    expect(new Set(rides.map(({ fingerprint }) => fingerprint)).size).toBe(2);
    expect(problems.map(({ line }) => line)).toEqual([4, 5, 6]);
    expect(problems[0]?.message).toContain('still to come');
    expect(problems[1]?.message).toContain('too long ago');
  });

  it('gives the same keys each time it is read', async () => {
    const once = await read('log.csv', 'date,distance_km\n2026-05-01,12.5\n2026-05-02,8\n');
    const again = await read('renamed.csv', 'date,distance_km\n2026-05-01,12.5\n2026-05-02,8\n');
    expect(again.rides).toEqual(once.rides);
  });

  it('takes another sport only when told to', async () => {
    const file = `<gpx xmlns="http://www.topografix.com/GPX/1/1"><trk><type>running</type><trkseg>
      <trkpt lat="48" lon="9"><time>2026-05-01T08:00:00Z</time></trkpt>
      <trkpt lat="48.01" lon="9"><time>2026-05-01T08:06:00Z</time></trkpt></trkseg></trk></gpx>`;
    const { rides, message } = await read('run.gpx', file);
    expect(rides).toEqual([]);
    expect(message).toContain('another sport');
    expect((await read('run.gpx', file, { otherSports: 'take' })).rides).toMatchObject([
      { date: '2026-05-01' },
    ]);
  });

  it('asks how the columns are meant, and goes by the answer', async () => {
    const file = 'date,distance\n03/04/2026,12\n05/06/2026,20\n';
    expect((await read('log.csv', file)).message).toContain('?');
    const matching: CsvMatching = {
      delimiter: ',',
      hasHeader: true,
      decimal: '.',
      dateOrder: 'mdy',
      distanceUnit: 'mi',
      timeUnit: 'h',
      shortClock: 'h:m',
      columns: { date: 0, distance: 1 },
    };
    const { rides } = await read('log.csv', file, { matching });
    // One international mile is 1,609.344 m (international yard and pound agreement, memory).
    expect(rides.map(({ date, distanceM }) => [date, distanceM])).toEqual([
      ['2026-03-04', 19_312],
      ['2026-05-06', 32_187],
    ]);
  });

  it('says in a sentence why nothing can be read', async () => {
    for (const text of ['', 'just a letter\nwith two lines\n', '<html><body>no</body></html>']) {
      const { rides, message } = await read('strange.csv', text);
      expect(rides).toEqual([]);
      expect(message).toMatch(/^[A-Z“].+\.$/);
    }
  });
});
