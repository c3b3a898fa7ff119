import { keyOnBike, movedKey } from './ride-key';

const [home, away, third] = ['a', 'b', 'c'].map(
  (letter) => `${letter.repeat(8)}-0000-4000-8000-${letter.repeat(12)}`,
);
const key = '2026-05-01|-|1250|0';

it('remembers the bike that a ride was read for, wherever it goes, and forgets it back at home', () => {
  expect(keyOnBike(key, home!, home!)).toBe(key);
  const once = keyOnBike(key, home!, away!);
  expect(once).toBe(movedKey(home!, key));
  expect(keyOnBike(once, away!, third!)).toBe(once);
  expect(keyOnBike(once, third!, home!)).toBe(key);
});
