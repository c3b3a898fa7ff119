import { xoroshiro128plus } from 'pure-rand/generator/xoroshiro128plus';
import { v7 } from 'uuid';

/** Seeded chance: the same seed gives the same draws on any machine. */
export class Random {
  private readonly source: ReturnType<typeof xoroshiro128plus>;

  constructor(seed: number) {
    this.source = xoroshiro128plus(seed);
  }

  /** Uniform in [0, 1). */
  float(): number {
    return (this.source.next() >>> 0) / 2 ** 32;
  }

  between(low: number, high: number): number {
    return low + (high - low) * this.float();
  }

  /** A whole number from low to high, both included. */
  int(low: number, high: number): number {
    return low + Math.floor(this.float() * (high - low + 1));
  }

  chance(probability: number): boolean {
    return this.float() < probability;
  }

  /** Standard normal, by Box and Muller. */
  normal(): number {
    return Math.sqrt(-2 * Math.log(1 - this.float())) * Math.cos(2 * Math.PI * this.float());
  }

  logNormal(median: number, logSd: number): number {
    return median * Math.exp(logSd * this.normal());
  }

  pick<T>(of: readonly T[]): T {
    const picked = of[this.int(0, of.length - 1)];
    if (picked === undefined) throw new Error('Nothing to pick from.');
    return picked;
  }

  /** One of the keys, as often as its weight says. */
  weighted<K extends string>(weights: Partial<Record<K, number>>): K {
    const keys = Object.keys(weights) as K[];
    const weightOf = (key: K) => weights[key] ?? 0;
    let left = this.float() * keys.reduce((sum, key) => sum + weightOf(key), 0);
    return keys.find((key) => (left -= weightOf(key)) < 0) ?? this.pick(keys);
  }

  /** A UUIDv7 of that day. */
  id(day: number): string {
    const bytes = new Uint8Array(16);
    for (let i = 0; i < 16; i += 4) {
      const word = this.source.next();
      for (let j = 0; j < 4; j++) bytes[i + j] = (word >>> (8 * j)) & 0xff;
    }
    return v7({ msecs: day * 86_400_000 + this.int(0, 86_399_999), random: bytes });
  }
}

/** A seed of its own for each part of the scenario, so that no part depends on the order they are made in. */
export function seedFor(seed: number, ...path: number[]): number {
  return path.reduce(
    (hash, part) => Math.imul(hash ^ (part + 0x9e3779b9), 0x85ebca6b) ^ (hash >>> 13),
    seed | 0,
  );
}
