import { fitCoefficients, Prior } from './coefficients';
import type { Outcome } from './lessons';
import type { Coefficients } from './model';
import { quantilesAt } from './quantiles';

const FOLDS = 3;
const FOLD_ITERATIONS = 60;
/** Aimed at a little below 0.8: models taught on two thirds of the riders miss more often than one taught on all. */
const COVERAGE = 0.79;

/** The width at which windows for riders left out of the fit hold as often as they say. */
export function* honestSpread(
  outcomes: readonly Outcome[],
  shrink: Prior | undefined,
): Generator<void, number> {
  const misses: number[] = [];
  for (let fold = 0; fold < FOLDS; fold++) {
    const taught = outcomes.filter(({ rider }) => rider % FOLDS !== fold);
    const left = outcomes.filter(({ rider }) => rider % FOLDS === fold);
    if (taught.length === 0 || left.length === 0) return 1;
    const model = yield* fitCoefficients(taught, FOLD_ITERATIONS, shrink);
    for (const outcome of left) misses.push(neededSpread(outcome, model));
  }
  misses.sort((a, b) => a - b);
  const spread = misses[Math.floor(COVERAGE * misses.length)] ?? 1;
  return Math.min(Math.max(Math.round(1000 * spread) / 1000, 0.5), 2);
}

/** The smallest width factor with which P10 to P90 would have held this outcome. */
function neededSpread({ features, km, days, horizon }: Outcome, model: Coefficients): number {
  const holds = (spread: number) => {
    const q = quantilesAt({ ...model, spread }, features, km);
    return days >= Math.min(q[1]!, horizon) && days <= (q[9]! >= horizon ? horizon : q[9]!);
  };
  for (let spread = 0.3; spread < 3; spread += 0.05) if (holds(spread)) return spread;
  return 3;
}
