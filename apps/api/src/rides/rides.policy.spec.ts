import { mayReachRide, wrongDay } from './rides.policy';

it('opens rides to the bike’s own rider and to staff', () => {
  const bike = { riderId: 'a' };
  expect(mayReachRide({ role: 'rider', riderId: 'a' }, bike)).toBe(true);
  expect(mayReachRide({ role: 'rider', riderId: 'b' }, bike)).toBe(false);
  expect(mayReachRide({ role: 'mechanic', riderId: null }, bike)).toBe(true);
});

it('takes a ride of any day from 1990 to today', () => {
  expect(wrongDay('2026-12-01', '2026-12-01')).toBeNull();
  expect(wrongDay('1990-01-01', '2026-12-01')).toBeNull();
  expect(wrongDay('2026-12-02', '2026-12-01')).toContain('still to come');
  expect(wrongDay('1989-12-31', '2026-12-01')).toContain('too long ago');
});
