const SQRT2 = Math.SQRT2;
const LOG_SQRT_2PI = 0.5 * Math.log(2 * Math.PI);

/** erfc by the continued expansion in Chebyshev polynomials of Numerical Recipes, 3rd ed., 6.2.2; error under 1.2e-16 relative. */
const COEFFICIENTS = [
  -1.3026537197817094, 6.4196979235649026e-1, 1.9476473204185836e-2, -9.561514786808631e-3,
  -9.46595344482036e-4, 3.66839497852761e-4, 4.2523324806907e-5, -2.0278578112534e-5, -1.624290004647e-6,
  1.30365583558e-6, 1.5626441722e-8, -8.5238095915e-8, 6.529054439e-9, 5.059343495e-9, -9.91364156e-10,
  -2.27365122e-10, 9.6467911e-11, 2.394038e-12, -6.886027e-12, 8.94487e-13, 3.13092e-13, -1.12708e-13,
  3.81e-16, 7.106e-15, -1.523e-15, -9.4e-17, 1.21e-16, -2.8e-17,
];

function erfcPositive(z: number): number {
  const t = 2 / (2 + z);
  const ty = 4 * t - 2;
  let d = 0;
  let dd = 0;
  for (let j = COEFFICIENTS.length - 1; j > 0; j--) {
    const previous = d;
    d = ty * d - dd + COEFFICIENTS[j]!;
    dd = previous;
  }
  return t * Math.exp(-z * z + 0.5 * (COEFFICIENTS[0]! + ty * d) - dd);
}

/** Standard normal distribution function. */
export function normalCdf(z: number): number {
  const x = z / SQRT2;
  return x <= 0 ? 0.5 * erfcPositive(-x) : 1 - 0.5 * erfcPositive(x);
}

/** Log of the standard normal density. */
export function logNormalPdf(z: number): number {
  return -0.5 * z * z - LOG_SQRT_2PI;
}

/** Standard normal density. */
export function normalPdf(z: number): number {
  return Math.exp(logNormalPdf(z));
}

/** Standard normal quantile: Acklam's rational approximation, polished by one Halley step. p in (0, 1). */
export function normalQuantile(p: number): number {
  const a = [
    -39.69683028665376, 220.9460984245205, -275.9285104469687, 138.357751867269, -30.66479806614716,
    2.506628277459239,
  ];
  const b = [
    -54.47609879822406, 161.5858368580409, -155.6989798598866, 66.80131188771972, -13.28068155288572,
  ];
  const c = [
    -0.007784894002430293, -0.3223964580411365, -2.400758277161838, -2.549732539343734, 4.374664141464968,
    2.938163982698783,
  ];
  const d = [0.007784695709041462, 0.3224671290700398, 2.445134137142996, 3.754408661907416];
  const poly = (coefficients: number[], x: number) => coefficients.reduce((sum, k) => sum * x + k, 0);
  const tail = (q: number) => poly(c, q) / (poly(d, q) * q + 1);
  let x: number;
  if (p < 0.02425) x = tail(Math.sqrt(-2 * Math.log(p)));
  else if (p > 1 - 0.02425) x = -tail(Math.sqrt(-2 * Math.log(1 - p)));
  else {
    const q = p - 0.5;
    const r = q * q;
    x = (poly(a, r) * q) / (poly(b, r) * r + 1);
  }
  const u = (normalCdf(x) - p) / normalPdf(x);
  return x - u / (1 + (x * u) / 2);
}
