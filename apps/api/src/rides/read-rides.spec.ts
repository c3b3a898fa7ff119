import { readRides } from './read-rides';

const read = (name: string, text: string) => readRides(name, Buffer.from(text), 'UTC', '2026-12-01');

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

  it('says in a sentence why nothing can be read', async () => {
    for (const text of ['', 'just a letter\nwith two lines\n', '<html><body>no</body></html>']) {
      const { rides, message } = await read('strange.csv', text);
      expect(rides).toEqual([]);
      expect(message).toMatch(/^[A-Z“].+\.$/);
    }
  });
});
