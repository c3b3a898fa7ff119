import { defaultFleetModel } from '../fleet-model';
import { normalQuantile } from '../math/normal';
import { seededRandom } from '../math/random';
import { fitElongationPriors, MeasuredChain } from './fit-priors';
import { methodErrors } from './methods';

const start = defaultFleetModel().elongation;

/** `count` waxed road chains whose log rates scatter by `logSd` about `median`, three three-point readings on each. */
function fleet(count: number, median: number, logSd: number, bikeKind: MeasuredChain['bikeKind'] = 'road') {
  const random = seededRandom(7);
  const normal = () => normalQuantile(Math.min(Math.max(random(), 1e-9), 1 - 1e-9));
  return Array.from({ length: count }, (): MeasuredChain => {
    const rate = median * Math.exp(logSd * normal());
    const { offset, offsetSd, noiseSd } = methodErrors['three-point'];
    const shift = offset + offsetSd * normal();
    const readings = [2000, 4000, 6000].map((wearKm, i) => ({
      id: String(i),
      day: wearKm,
      method: 'three-point' as const,
      gauge: 'bench',
      values: [0.025 + (rate * wearKm) / 1000 + shift + noiseSd * normal()],
      wearKm,
    }));
    return { regime: 'immersion-wax', bikeKind, readings };
  });
}

describe('fitElongationPriors', () => {
  it('leaves the start as it is without chains', () => {
    const { rate } = fitElongationPriors([], start);
    expect(rate['wet-oil'].gravel.median).toBeCloseTo(start.rate['wet-oil'].gravel.median, 12);
    expect(rate['wet-oil'].gravel).toMatchObject({ logSd: 0.5, chains: 0 });
  });

  it('finds the median and the scatter of a large fleet', () => {
    const { median, logSd, chains } = fitElongationPriors(fleet(150, 0.07, 0.3), start).rate['immersion-wax']
      .road;
    expect(chains).toBe(150);
    expect(Math.abs(Math.log(median / 0.07))).toBeLessThan(0.08);
    expect(logSd).toBeGreaterThan(0.25);
    expect(logSd).toBeLessThan(0.38);
  });

  it('lets a few chains move it a little, and many chains more', () => {
    const median = (count: number) =>
      fitElongationPriors(fleet(count, 0.08, 0.05), start).rate['immersion-wax'].road.median;
    expect(median(1)).toBeGreaterThan(0.04);
    expect(median(1)).toBeLessThan(median(10));
    expect(median(10)).toBeLessThan(0.09);
  });

  it('lends what one kind of riding showed to the others of its regime, and to no other regime', () => {
    const { rate } = fitElongationPriors(fleet(60, 0.08, 0.3), start);
    expect(rate['immersion-wax'].gravel.median).toBeGreaterThan(0.05);
    expect(rate['immersion-wax'].gravel.median).toBeLessThan(rate['immersion-wax'].road.median);
    expect(rate['drip-wax'].road.median).toBeCloseTo(0.08, 12);
  });

  it('takes no notice of a chain that was only measured new', () => {
    const [chain] = fleet(1, 0.08, 0.3);
    const baseline = { ...chain!, readings: [{ ...chain!.readings[0]!, wearKm: 0, baseline: true }] };
    expect(fitElongationPriors([baseline], start).rate['immersion-wax'].road.chains).toBe(0);
  });
});
