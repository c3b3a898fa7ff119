import { poissonBinomial } from './poisson-binomial';
import { withRenewals, workload } from './workload';

// The example of the R package poibin: p = .1, .2, .3, .4, .5 (computed).
it('gives the published Poisson-binomial distribution to 1e-8', () => {
  const p = [0.1, 0.2, 0.3, 0.4, 0.5];
  const twice = [
    0.02286144, 0.11231136, 0.23694372, 0.28171848, 0.20829484, 0.09968032, 0.03113484, 0.00623848,
    0.00076372, 0.00005136, 0.00000144,
  ];
  [...poissonBinomial([...p, ...p])].forEach((mass, k) =>
    expect(Math.abs(mass - twice[k]!)).toBeLessThan(1e-8),
  );
  const once = [0.1512, 0.3714, 0.3274, 0.1274, 0.0214, 0.0012];
  [...poissonBinomial(p)].forEach((mass, k) => expect(Math.abs(mass - once[k]!)).toBeLessThan(1e-8));
});

it('lets a treatment fall due again after its usual life, not after what the present one has left', () => {
  const nearlySpent = [1, 0, 0, 0, 0, 0, 0, 0];
  const fourWeeks = [0, 0, 0, 0, 1];
  expect(withRenewals(nearlySpent, 8, fourWeeks)).toEqual([1, 0, 0, 0, 1, 0, 0, 0]);
});

it('keeps a chain due until its rider comes', () => {
  const chances = withRenewals([1, 0, 0, 0], 4, [], 0.5);
  expect(chances).toEqual([0.5, 0.25, 0.125, 0.0625]);
});

it('sums the chains of a week exactly', () => {
  const chain = { lubrication: [0.5, 0.5], renewal: [], replacement: [0, 0] };
  const [first] = workload(Array<typeof chain>(10).fill(chain), { weeks: 2, comes: 1 });
  expect(first!.treatments.mean).toBeCloseTo(5, 12);
  expect([first!.treatments.p10, first!.treatments.p50, first!.treatments.p90]).toEqual([3, 5, 7]);
  expect(first!.replacements).toEqual({ p10: 0, p50: 0, p90: 0, mean: 0 });
});
