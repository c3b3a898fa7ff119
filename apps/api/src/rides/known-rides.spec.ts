import { KnownRide, KnownRides } from './known-rides';

const ride = (change: Partial<KnownRide> = {}): KnownRide => ({
  date: '2026-05-01',
  startedAt: '2026-05-01T07:00:00Z',
  distanceM: 20_000,
  movingS: 3600,
  elapsedS: null,
  ...change,
});
const typed = ride({ startedAt: null, movingS: null });

it('knows the ride from another device, also over midnight', () => {
  const known = new KnownRides([ride({ date: '2026-04-30', startedAt: '2026-04-30T23:30:00Z' })]);
  expect(known.has(ride({ startedAt: '2026-04-30T23:31:00Z', distanceM: 20_300 }))).toBe(true);
  expect(known.has(ride())).toBe(false);
});

it('takes what was typed in for one ride only', () => {
  const known = new KnownRides([typed]);
  expect(known.has(ride())).toBe(true);
  expect(known.has(ride({ startedAt: '2026-05-01T17:00:00Z' }))).toBe(false);
});

it('leaves two rides without a start to their keys', () => {
  expect(new KnownRides([typed]).has(typed)).toBe(false);
});
