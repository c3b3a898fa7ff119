import { PROMISED, type WindowOutcome } from './window-outcome';

const ROUNDS = 2000;
const STILL = 1e-10;

/**
 * The shares of due days that fell before the window, in its first half, in its second half and after it, most likely
 * by outcomes that often leave several parts open: the self-consistent estimate from interval-censored data.
 * Source: B. W. Turnbull, The empirical distribution function with arbitrarily grouped, censored and truncated data,
 * JRSS B 38 (1976). Where the outcomes don't tell parts apart, it stays with what the window promises.
 */
export function sharesOfParts(outcomes: readonly Pick<WindowOutcome, 'parts'>[]): number[] {
  let shares: number[] = [...PROMISED];
  for (let round = 0; round < ROUNDS && outcomes.length > 0; round++) {
    const counts = shares.map(() => 0);
    for (const { parts } of outcomes) {
      const [first, last] = parts;
      const within = shares.slice(first, last + 1).reduce((sum, share) => sum + share, 0);
      for (let part = first; part <= last; part++) counts[part]! += shares[part]! / within;
    }
    const next = counts.map((count) => count / outcomes.length);
    const moved = Math.max(...next.map((share, part) => Math.abs(share - shares[part]!)));
    shares = next;
    if (moved < STILL) break;
  }
  return shares;
}
