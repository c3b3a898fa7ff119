import { sharesOfParts } from './shares-of-parts';
import { wilson } from './wilson';
import type { WindowOutcome } from './window-outcome';

export interface WindowScore {
  /** Windows that were held against something seen. */
  cases: number;
  held: number;
  sooner: number;
  later: number;
  /** What was seen fits both a due day inside the window and one outside it. */
  open: number;
  /** Of the windows whose due day is known: the share that held, with its 95 % interval; the others would favour misses. */
  known: { n: number; share: number; low: number; high: number } | null;
  /** Likeliest shares of due days before the window, in its first half, its second half, and after; promised 10, 40, 40, 10 %. */
  parts: number[];
  /** Median days from the middle of the window to the due day, where known; positive = later than said. */
  medianMissDays: number | null;
}

function median(values: readonly number[]): number | null {
  if (values.length === 0) return null;
  const ordered = [...values].sort((a, b) => a - b);
  const middle = (ordered.length - 1) / 2;
  return (ordered[Math.floor(middle)]! + ordered[Math.ceil(middle)]!) / 2;
}

/** How right the windows were, by what was seen. */
export function scoreWindows(outcomes: readonly WindowOutcome[]): WindowScore {
  const count = (verdict: WindowOutcome['verdict']) =>
    outcomes.filter((outcome) => outcome.verdict === verdict).length;
  const n = outcomes.filter(({ dayKnown }) => dayKnown).length;
  return {
    cases: outcomes.length,
    held: count('held'),
    sooner: count('sooner'),
    later: count('later'),
    open: count('open'),
    known: n === 0 ? null : { n, share: count('held') / n, ...wilson(count('held'), n) },
    parts: sharesOfParts(outcomes),
    medianMissDays: median(outcomes.flatMap(({ missedBy }) => missedBy ?? [])),
  };
}
