import type { Day } from '../types';

/** What was seen on a day of something that falls due: due before it, due about then, or not due yet. */
export type Seen = 'before' | 'then' | 'after';

/** A window as it was told; null = not within the horizon. */
export interface ToldWindow {
  p10: Day | null;
  p50: Day | null;
  p90: Day | null;
}

/** Parts of a window that a due day can fall in: before it, its first half, its second half, after it. */
export const PROMISED = [0.1, 0.4, 0.4, 0.1] as const;

export interface WindowOutcome {
  /** The parts of the window, first and last, that the due day can have fallen in by what was seen. */
  parts: readonly [first: number, last: number];
  /** Whether the due day surely fell inside, surely sooner or later than the window, or whether that stays open. */
  verdict: 'held' | 'sooner' | 'later' | 'open';
  /** The due day itself was seen, not only a side of it. */
  dayKnown: boolean;
  /** Days by which it fell due after the window's middle; null where the day isn't known or the middle is far off. */
  missedBy: number | null;
}

/** The part of the window that a day lies in, 0 to 3; the window's own first and last day lie inside. */
function partOf(day: Day, { p10, p50, p90 }: ToldWindow): number {
  if (p10 === null || day < p10) return 0;
  if (p50 === null || day <= p50) return 1;
  return p90 === null || day <= p90 ? 2 : 3;
}

/**
 * Holds a told window against what was seen on a day. A due day is hardly ever seen itself: a treatment found quiet
 * shows that it was still ahead, one found dry that it had passed; only 'then' names it.
 */
export function windowOutcome(window: ToldWindow, day: Day, seen: Seen): WindowOutcome {
  const part = partOf(day, window);
  if (seen === 'then') {
    const verdict = part === 0 ? 'sooner' : part === 3 ? 'later' : 'held';
    return {
      parts: [part, part],
      verdict,
      dayKnown: true,
      missedBy: window.p50 === null ? null : day - window.p50,
    };
  }
  const parts = seen === 'after' ? ([part, 3] as const) : ([0, part] as const);
  const verdict = parts[0] === 3 ? 'later' : parts[1] === 0 ? 'sooner' : 'open';
  return { parts, verdict, dayKnown: false, missedBy: null };
}
