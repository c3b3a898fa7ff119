import { mayReachReading, mayRemoveReading, wrongReadingDay } from './readings.policy';

it('opens readings to the chain’s own rider and to staff', () => {
  const chain = { riderId: 'a' };
  expect(mayReachReading({ role: 'rider', riderId: 'a' }, chain)).toBe(true);
  expect(mayReachReading({ role: 'rider', riderId: 'b' }, chain)).toBe(false);
  expect(mayReachReading({ role: 'desk', riderId: null }, chain)).toBe(true);
});

it('takes a reading of any day from the first in service to today', () => {
  const chain = { inServiceOn: '2026-03-01' };
  expect(wrongReadingDay('2026-03-01', chain, '2026-12-01')).toBeNull();
  expect(wrongReadingDay('2026-12-01', chain, '2026-12-01')).toBeNull();
  expect(wrongReadingDay('2026-02-28', chain, '2026-12-01')).toContain('2026-03-01');
  expect(wrongReadingDay('2026-12-02', chain, '2026-12-01')).toContain('still to come');
});

it('lets a rider take back only what they measured themself', () => {
  expect(mayRemoveReading({ role: 'rider', accountId: 'a' }, { byAccountId: 'a' })).toBe(true);
  expect(mayRemoveReading({ role: 'rider', accountId: 'a' }, { byAccountId: 'b' })).toBe(false);
  expect(mayRemoveReading({ role: 'rider', accountId: 'a' }, { byAccountId: null })).toBe(false);
  expect(mayRemoveReading({ role: 'mechanic', accountId: 'c' }, { byAccountId: 'b' })).toBe(true);
});
