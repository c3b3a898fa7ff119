import { normalCdf, normalPdf } from '../math/normal';

/** A standard distribution of (log life − location) / scale. */
export interface Standard {
  /** P(Z <= z) and P(Z > z), each without loss of digits in its own tail. */
  cdf(z: number): number;
  survival(z: number): number;
  pdf(z: number): number;
  /** Derivative of the density. */
  slope(z: number): number;
}

/** Log life is normal: the life is log-normal. */
export const logNormal: Standard = {
  cdf: normalCdf,
  survival: (z) => normalCdf(-z),
  pdf: normalPdf,
  slope: (z) => (Math.abs(z) > 40 ? 0 : -z * normalPdf(z)),
};

/** Log life is of the smallest extreme value distribution: the life is Weibull, shape 1 / scale. */
export const weibull: Standard = {
  cdf: (z) => -Math.expm1(-Math.exp(z)),
  survival: (z) => Math.exp(-Math.exp(z)),
  pdf: (z) => (z > 6 ? 0 : Math.exp(z - Math.exp(z))),
  slope: (z) => (z > 6 ? 0 : Math.exp(z - Math.exp(z)) * (1 - Math.exp(z))),
};
