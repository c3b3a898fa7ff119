import type { Band } from '../types';
import { pmfQuantile, poissonBinomial } from './poisson-binomial';

/** One chain's chances of (first) falling due in each coming week. */
export interface ChainChances {
  lubrication: readonly number[] | null;
  replacement: readonly number[];
  /** Chance that a treatment given now falls due in week w from now; without it, as the present one did. */
  renewal?: readonly number[];
}

export interface WorkloadOptions {
  weeks: number;
  /** Chance that the rider of a chain that is due comes in that week; who does not is still due in the next. */
  comes: number;
}

export interface WeekLoad {
  treatments: Band & { mean: number };
  replacements: Band & { mean: number };
}

/** Chance of a visit in each week when what fell due waits until its rider comes. */
function visits(due: readonly number[], weeks: number, comes: number, again: readonly number[]): number[] {
  const falling = Array.from({ length: weeks }, (_, w) => due[w] ?? 0);
  let waiting = 0;
  return falling.map((_, w) => {
    waiting += falling[w]!;
    const visit = Math.min(waiting * comes, 1);
    waiting -= visit;
    // What is treated this week falls due again as a fresh treatment does; within the week counts as the next.
    for (let later = w + 1; later < weeks; later++)
      falling[later]! += visit * ((again[later - w] ?? 0) + (later === w + 1 ? (again[0] ?? 0) : 0));
    return visit;
  });
}

/**
 * Chance of a visit in each week, renewals included: a treatment given in week s falls due again after a fresh
 * treatment's life (`renewal`, by weeks from the treatment), not after what is left of the present one.
 */
export function withRenewals(
  first: readonly number[],
  weeks: number,
  renewal: readonly number[] = first,
  comes = 1,
): number[] {
  return visits(first, weeks, comes, renewal);
}

/** Chance of a visit in each week, where what fell due waits until its rider comes and does not fall due again. */
export function waitingVisits(due: readonly number[], weeks: number, comes: number): number[] {
  return visits(due, weeks, comes, []);
}

/** Expected treatments and replacements per week: chains are independent, so each week's count is Poisson-binomial. */
export function workload(chains: readonly ChainChances[], { weeks, comes }: WorkloadOptions): WeekLoad[] {
  const treating = chains.flatMap(({ lubrication, renewal }) =>
    lubrication ? [withRenewals(lubrication, weeks, renewal, comes)] : [],
  );
  const replacing = chains.map(({ replacement }) => waitingVisits(replacement, weeks, comes));
  return Array.from({ length: weeks }, (_, w) => ({
    treatments: summary(treating.map((chances) => chances[w]!)),
    replacements: summary(replacing.map((chances) => chances[w]!)),
  }));
}

function summary(chances: number[]): Band & { mean: number } {
  const pmf = poissonBinomial(chances);
  const at = (level: number) => pmfQuantile(pmf, level);
  return { p10: at(0.1), p50: at(0.5), p90: at(0.9), mean: chances.reduce((sum, p) => sum + p, 0) };
}
