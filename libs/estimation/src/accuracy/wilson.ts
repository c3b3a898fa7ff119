/** The 97.5 % point of the standard normal. */
const Z = 1.959963984540054;

/**
 * Wilson's 95 % score interval of a share: `hits` of `n`. Honest for few and for extreme counts; [0, 1] of none.
 * Source: E. B. Wilson, Probable inference, the law of succession, and statistical inference, JASA 22 (1927).
 */
export function wilson(hits: number, n: number): { low: number; high: number } {
  if (n === 0) return { low: 0, high: 1 };
  const share = hits / n;
  const middle = share + (Z * Z) / (2 * n);
  const reach = Z * Math.sqrt((share * (1 - share)) / n + (Z * Z) / (4 * n * n));
  const whole = 1 + (Z * Z) / n;
  return { low: Math.max((middle - reach) / whole, 0), high: Math.min((middle + reach) / whole, 1) };
}
