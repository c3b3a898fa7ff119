import { sharesOfParts } from './shares-of-parts';

type Parts = [number, number];
const outcomes = (...groups: [count: number, parts: Parts][]) =>
  groups.flatMap(([count, parts]) => Array.from({ length: count }, () => ({ parts })));
const logLikelihood = (shares: number[], seen: { parts: Parts }[]) =>
  seen.reduce(
    (sum, { parts: [a, b] }) =>
      sum + Math.log(shares.slice(a, b + 1).reduce((total, share) => total + share, 0)),
    0,
  );

describe('sharesOfParts', () => {
  it('counts where every day is known', () => {
    const shares = sharesOfParts(outcomes([2, [0, 0]], [5, [1, 1]], [8, [2, 2]], [5, [3, 3]]));
    [0.1, 0.25, 0.4, 0.25].forEach((share, part) => expect(shares[part]).toBeCloseTo(share, 8));
  });

  it('finds what no other shares make likelier', () => {
    const seen = outcomes([3, [0, 0]], [6, [1, 1]], [4, [2, 3]], [5, [1, 3]], [2, [0, 2]], [3, [3, 3]]);
    const best = logLikelihood(sharesOfParts(seen), seen);
    for (let a = 0; a <= 40; a++)
      for (let b = 0; a + b <= 40; b++)
        for (let c = 0; a + b + c <= 40; c++) {
          const shares = [a / 40, b / 40, c / 40, (40 - a - b - c) / 40];
          expect(logLikelihood(shares, seen)).toBeLessThanOrEqual(best + 1e-9);
        }
  });

  it('stays with the promise where nothing tells', () => {
    const open = sharesOfParts(outcomes([5, [0, 3]]));
    [0.1, 0.4, 0.4, 0.1].forEach((share, part) => expect(open[part]).toBeCloseTo(share, 12));
    expect(sharesOfParts([])).toEqual([0.1, 0.4, 0.4, 0.1]);
  });
});
