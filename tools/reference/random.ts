import { uniformFloat64 } from 'pure-rand/distribution/uniformFloat64';
import { xoroshiro128plus } from 'pure-rand/generator/xoroshiro128plus';
import { jStat } from 'jstat';

/** Seeded draws for generated chains. */
export interface Draw {
  uniform(low: number, high: number): number;
  normal(mean: number, sd: number): number;
  /** A whole number from low to high, both included. */
  whole(low: number, high: number): number;
  oneOf<T>(items: readonly T[]): T;
  chance(p: number): boolean;
}

export function drawFrom(seed: number): Draw {
  const generator = xoroshiro128plus(seed);
  const next = () => uniformFloat64(generator);
  const uniform = (low: number, high: number) => low + next() * (high - low);
  const whole = (low: number, high: number) => Math.floor(uniform(low, high + 1));
  return {
    uniform,
    whole,
    normal: (mean, sd) => jStat.normal.inv(Math.min(Math.max(next(), 1e-12), 1 - 1e-12), mean, sd),
    oneOf: (items) => items[whole(0, items.length - 1)]!,
    chance: (p) => next() < p,
  };
}
