import { band, counts, map, plus } from './counts';

it('counts two coins exactly', () => {
  expect([...counts([0.5, 0.5])]).toEqual([
    [0, 0.25],
    [1, 0.5],
    [2, 0.25],
  ]);
  expect(band(counts([0.5, 0.5]))).toEqual({ p10: 0, p50: 1, p90: 2, mean: 1 });
});

it('sums minutes of two kinds: the levels of a sum are not the sum of levels', () => {
  const ten = map(counts([0.1]), (n) => n * 10);
  const both = plus(
    ten,
    map(counts([0.1]), (n) => n * 10),
  );
  expect(both.get(0)).toBeCloseTo(0.81, 12);
  expect(both.get(20)).toBeCloseTo(0.01, 12);
  expect(band(ten).p90).toBe(0);
  expect(band(both).p90).toBe(10);
  expect(band(both).mean).toBeCloseTo(2, 12);
});

it('puts the chains of a load together', () => {
  const loads = map(counts([1, 1, 1, 0.5]), (n) => Math.ceil(n / 3));
  expect([...loads].filter(([, chance]) => chance > 0)).toEqual([
    [1, 0.5],
    [2, 0.5],
  ]);
});
