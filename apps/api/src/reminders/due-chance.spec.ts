import { chanceWithin } from './due-chance';

const window = {
  p10: null,
  p50: null,
  p90: null,
  chanceNow: 0.1,
  chanceWithin7: 0.3,
  chanceWithin14: 0.4,
  chanceWithin30: 0.7,
  decidedBy: 'distance' as const,
};
const weekly = [0.25, 0.1, 0.1, 0.1, 0.2];

it.each([
  [0, 0.1],
  [6, 0.25],
  [7, 0.3],
  [14, 0.4],
  [30, 0.7],
  [3, 0.175],
  [32, 0.725],
  [34, 0.75],
  [60, 0.75],
])('within %i days it is %f', (days, chance) => {
  expect(chanceWithin(window, weekly, days)).toBeCloseTo(chance, 10);
});
