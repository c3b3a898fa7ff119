import type { Standard } from './location-scale';

/** A life known to lie in (low, high]; low 0 = found failed, high Infinity = still good; `count` of them alike. */
export interface CensoredLife {
  low: number;
  high: number;
  count?: number;
}

/** Log-likelihood with its first and second derivatives by location and log scale. */
export interface Curvature {
  value: number;
  gradient: [location: number, logScale: number];
  /** Second derivatives: by location twice, by both, by log scale twice. */
  hessian: [aa: number, ab: number, bb: number];
}

const LEAST = 1e-300;

/** Log-likelihood of interval-censored lives under location + scale · Z for log life. */
export function intervalLikelihood(
  lives: readonly CensoredLife[],
  { cdf, survival, pdf, slope }: Standard,
  location: number,
  scale: number,
): Curvature {
  const result: Curvature = { value: 0, gradient: [0, 0], hessian: [0, 0, 0] };
  for (const { low, high, count = 1 } of lives) {
    const from = (Math.log(low) - location) / scale;
    const to = (Math.log(high) - location) / scale;
    const chance = Math.max(from > 0 ? survival(from) - survival(to) : cdf(to) - cdf(from), LEAST);
    // Differences over the interval of z^k f(z) and z^k f'(z); nothing at its infinite ends.
    const over = (g: (z: number) => number) =>
      (Number.isFinite(to) ? g(to) : 0) - (Number.isFinite(from) ? g(from) : 0);
    const f = over(pdf);
    const zf = over((z) => z * pdf(z));
    const df = over(slope);
    const zdf = over((z) => z * slope(z));
    const zzdf = over((z) => z * z * slope(z));
    const a = -f / scale / chance;
    const b = -zf / chance;
    result.value += count * Math.log(chance);
    result.gradient[0] += count * a;
    result.gradient[1] += count * b;
    result.hessian[0] += count * (df / scale ** 2 / chance - a * a);
    result.hessian[1] += count * ((f + zdf) / scale / chance - a * b);
    result.hessian[2] += count * ((zf + zzdf) / chance - b * b);
  }
  return result;
}
