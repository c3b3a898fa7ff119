/** Equally likely points that stand for a distribution of km left. */
const ATOMS = 24;

/** Km still to ride until due, as equally likely atoms, ascending; zero or less is due already. */
export type KmLeft = readonly number[];

/** Atoms at the middle of equal shares of a distribution given by its quantiles. */
export function atomsOf(quantile: (p: number) => number): KmLeft {
  return Array.from({ length: ATOMS }, (_, i) => quantile((i + 0.5) / ATOMS));
}
