import type { Band } from '../types';
import { pmfQuantile, poissonBinomial } from './poisson-binomial';

/** One chain's chances of (first) falling due in each coming week. */
export interface ChainChances {
  lubrication: readonly number[] | null;
  replacement: readonly number[];
}

export interface WorkloadOptions {
  weeks: number;
  /** Chance that a rider whose chain is due comes in at all. */
  comes: number;
}

export interface WeekLoad {
  treatments: Band & { mean: number };
  replacements: Band & { mean: number };
}

/** Chance of a visit in each week, renewals included: a treatment given in week s falls due again as a fresh one would. */
export function withRenewals(first: readonly number[], weeks: number): number[] {
  const renewal = first.slice(0, weeks);
  for (let w = 0; w < weeks; w++) {
    for (let s = 0; s < w; s++) renewal[w] = renewal[w]! + renewal[s]! * (first[w - s] ?? 0);
  }
  return renewal.map((chance) => Math.min(chance, 1));
}

/** Expected treatments and replacements per week: chains are independent, so each week's count is Poisson-binomial. */
export function workload(chains: readonly ChainChances[], { weeks, comes }: WorkloadOptions): WeekLoad[] {
  const lubrication = chains.flatMap(({ lubrication }) =>
    lubrication ? [withRenewals(lubrication, weeks)] : [],
  );
  return Array.from({ length: weeks }, (_, w) => ({
    treatments: summary(lubrication.map((chances) => (chances[w] ?? 0) * comes)),
    replacements: summary(chains.map(({ replacement }) => Math.min((replacement[w] ?? 0) * comes, 1))),
  }));
}

function summary(chances: number[]): Band & { mean: number } {
  const pmf = poissonBinomial(chances);
  const at = (level: number) => pmfQuantile(pmf, level);
  return { p10: at(0.1), p50: at(0.5), p90: at(0.9), mean: chances.reduce((sum, p) => sum + p, 0) };
}
