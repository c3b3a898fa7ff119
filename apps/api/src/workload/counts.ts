import { poissonBinomial } from '@halfpitch/estimation';

/** A distribution over amounts: each with its chance. */
export type Amounts = ReadonlyMap<number, number>;

/** How many of independent events happen, exactly. */
export function counts(chances: readonly number[]): Amounts {
  return new Map([...poissonBinomial(chances)].map((chance, count) => [count, chance]));
}

/** The same chances for another amount: a count of chains as minutes, or as loads of the pot. */
export function map(amounts: Amounts, to: (amount: number) => number): Amounts {
  const result = new Map<number, number>();
  for (const [amount, chance] of amounts) result.set(to(amount), (result.get(to(amount)) ?? 0) + chance);
  return result;
}

/** Below this a pair of amounts is left out: all of them together are beyond any figure shown. */
const NEGLIGIBLE = 1e-12;

/** The sum of two independent amounts. */
export function plus(a: Amounts, b: Amounts): Amounts {
  const result = new Map<number, number>();
  for (const [one, p] of a) {
    for (const [other, q] of b) {
      if (p * q > NEGLIGIBLE) result.set(one + other, (result.get(one + other) ?? 0) + p * q);
    }
  }
  return result;
}

/** Levels and mean of a distribution. */
export function band(amounts: Amounts) {
  const ordered = [...amounts].sort(([a], [b]) => a - b);
  const at = (level: number) => {
    let below = 0;
    const found = ordered.find(([, chance]) => (below += chance) >= level - 1e-9);
    return (found ?? ordered.at(-1)!)[0];
  };
  const mean = ordered.reduce((sum, [amount, chance]) => sum + amount * chance, 0);
  return { p10: at(0.1), p50: at(0.5), p90: at(0.9), mean };
}
