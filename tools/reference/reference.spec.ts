import { compare } from './compare';
import { generateChain } from './generate-chain';

/** All 200 chains: `npm run reference`. */
const SUBSET = 20;

describe('the elongation posterior beside brute-force summation', () => {
  it.each(Array.from({ length: SUBSET }, (_, i) => 10 * i))(
    'agrees to 1 % of the width on chain %i',
    (seed) => {
      const { worst, chancePast } = compare(generateChain(seed));
      expect(worst).toBeLessThan(0.01);
      expect(chancePast).toBeLessThan(0.005);
    },
  );

  it('is put to go/no-go answers, baselines, several places and several gauges', () => {
    const readings = Array.from({ length: SUBSET }, (_, i) => generateChain(10 * i).readings).flat();
    const some = (of: (reading: (typeof readings)[number]) => boolean) => readings.filter(of).length;
    expect(some(({ lower, upper }) => lower !== undefined || upper !== undefined)).toBeGreaterThan(5);
    expect(some(({ baseline }) => baseline === true)).toBeGreaterThan(2);
    expect(some(({ values }) => (values?.length ?? 0) > 1)).toBeGreaterThan(10);
    expect(new Set(readings.map(({ method }) => method)).size).toBe(5);
  });
});
