import { assertWithin } from '../errors';

/** Exact distribution of a sum of independent yes/no events with chances `p`: result[k] = P(sum = k), by convolution. */
export function poissonBinomial(p: readonly number[]): Float64Array {
  const pmf = new Float64Array(p.length + 1);
  pmf[0] = 1;
  p.forEach((chance, n) => {
    assertWithin('A chance', chance, 0, 1);
    for (let k = n + 1; k > 0; k--) pmf[k] = pmf[k]! * (1 - chance) + pmf[k - 1]! * chance;
    pmf[0]! *= 1 - chance;
  });
  return pmf;
}

/** Smallest k with P(sum <= k) >= level. */
export function pmfQuantile(pmf: Float64Array, level: number): number {
  let below = 0;
  const k = pmf.findIndex((mass) => (below += mass) >= level - 1e-12);
  return k < 0 ? pmf.length - 1 : k;
}
