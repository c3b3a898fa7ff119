import { wilson } from './wilson';

// R. G. Newcombe, Two-sided confidence intervals for the single proportion, Statistics in Medicine 17 (1998),
// table I, method 3 (memory).
it.each([
  [81, 263, 0.2553, 0.3662],
  [15, 148, 0.0624, 0.1605],
  [0, 20, 0, 0.1611],
  [1, 29, 0.0061, 0.1718],
])('%i of %i', (hits, n, low, high) => {
  const interval = wilson(hits, n);
  expect(interval.low).toBeCloseTo(low, 4);
  expect(interval.high).toBeCloseTo(high, 4);
});

it('knows nothing from nothing', () => expect(wilson(0, 0)).toEqual({ low: 0, high: 1 }));
