import fc from 'fast-check';
import { fingerprintAll } from './fingerprint';
import { sameRide } from './same-ride';

const ride = (
  startedAt: string | null,
  distanceM: number,
  elapsedS: number | null = 3600,
  date = '2025-05-03',
) => ({
  date,
  startedAt,
  distanceM,
  movingS: null,
  elapsedS,
});

const rides = fc.array(
  fc.record({
    date: fc.constantFrom('2025-05-03', '2025-05-04'),
    startedAt: fc.constantFrom(null, '2025-05-03T08:00:00.000Z', '2025-05-03T17:00:00.000Z'),
    distanceM: fc.integer({ min: 1, max: 60 }),
  }),
);

describe('fingerprintAll', () => {
  it('gives every ride of a file its own key, and the same keys when the file comes again', () => {
    fc.assert(
      fc.property(rides, (file) => {
        const keys = fingerprintAll(file);
        expect(new Set(keys).size).toBe(file.length);
        expect(fingerprintAll(file)).toEqual(keys);
      }),
    );
  });

  it('keeps the old keys of a log that has grown', () => {
    fc.assert(
      fc.property(rides, rides, (log, more) => {
        expect(fingerprintAll([...log, ...more]).slice(0, log.length)).toEqual(fingerprintAll(log));
      }),
    );
  });
});

describe('sameRide', () => {
  const first = ride('2025-05-03T08:00:00.000Z', 30_000);

  it.each([
    ['another device, a minute later and 2 % longer', ride('2025-05-03T08:01:00.000Z', 30_600), true],
    ['started after half the ride', ride('2025-05-03T08:31:00.000Z', 30_000), false],
    ['same time, twice the distance', ride('2025-05-03T08:00:00.000Z', 60_000), false],
    ['the way back in the evening', ride('2025-05-03T17:00:00.000Z', 30_000), false],
    ['typed in with its day only', ride(null, 30_050, null), true],
    ['another ride of that day, typed in', ride(null, 12_000, null), false],
    ['typed in for the day after', ride(null, 30_000, null, '2025-05-04'), false],
  ])('%s', (_, other, same) => {
    expect(sameRide(first, other)).toBe(same);
    expect(sameRide(other, first)).toBe(same);
  });

  it('leaves two rides without a start to their fingerprints', () => {
    expect(sameRide(ride(null, 8000, null), ride(null, 8000, null))).toBe(false);
  });
});
