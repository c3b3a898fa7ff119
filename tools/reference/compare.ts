import { elongationPosterior } from '../../libs/estimation/src/elongation/posterior';
import { bruteForce, chanceBelow, Consequence, quantile } from './brute-force';
import type { GeneratedChain } from './generate-chain';

export interface Agreement {
  /** Largest difference of any level, as a share of its P10-P90 width. */
  worst: number;
  /** Where it is. */
  at: string;
  /** Levels that lie in an all but empty gap between two explanations, where any value is as good: see EMPTY. */
  inGaps: number;
  /** Difference of the chance that the limit is past. */
  chancePast: number;
  milliseconds: { product: number; reference: number };
}

/**
 * Contradictory readings can leave two explanations with nothing between them. Where a level falls into such a gap, the
 * smallest chance spans half the window; there the two must agree in the chance below the product's level instead.
 */
const EMPTY = 0.0025;

/** How far the product's quadrature lies from the brute-force sum on one chain. */
export function compare(chain: GeneratedChain): Agreement {
  const { wearKm, limitPct } = chain;
  const start = performance.now();
  const posterior = elongationPosterior(chain.readings, chain.prior);
  const left = (p: number) => posterior.wearKmLeft(wearKm, limitPct, p);
  const ours = {
    rate: posterior.rate,
    elongation: posterior.elongationAt(wearKm),
    'wear km left': { p10: left(0.1), p50: left(0.5), p90: left(0.9) },
  };
  const between = performance.now();
  const atoms = bruteForce(chain);
  const elongation: Consequence = (rate, runIn) => runIn + (rate * wearKm) / 1000;
  const theirs: Record<keyof typeof ours, Consequence> = {
    rate: (rate) => rate,
    elongation,
    'wear km left': (rate, runIn) => (1000 * Math.max(limitPct - runIn, 0)) / rate - wearKm,
  };
  let worst = 0;
  let at = '';
  let inGaps = 0;
  for (const name of Object.keys(ours) as (keyof typeof ours)[]) {
    const [p10, p50, p90] = [0.1, 0.5, 0.9].map((p) => quantile(atoms, theirs[name], p)) as [
      number,
      number,
      number,
    ];
    for (const [level, value] of Object.entries({ p10, p50, p90 }) as ['p10' | 'p50' | 'p90', number][]) {
      const difference = Math.abs(ours[name][level] - value) / (p90 - p10);
      const chance = { p10: 0.1, p50: 0.5, p90: 0.9 }[level];
      if (difference > 0.01 && Math.abs(chanceBelow(atoms, theirs[name], ours[name][level]) - chance) < EMPTY)
        inGaps++;
      else if (difference > worst) [worst, at] = [difference, `${name} ${level}`];
    }
  }
  const past = 1 - chanceBelow(atoms, elongation, limitPct);
  return {
    worst,
    at,
    inGaps,
    chancePast: Math.abs(past - posterior.chancePast(wearKm, limitPct)),
    milliseconds: { product: between - start, reference: performance.now() - between },
  };
}
