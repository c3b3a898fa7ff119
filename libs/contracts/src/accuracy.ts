import { z } from 'zod';
import { day, id } from './common';
import { treatmentKinds } from './trade';

const share = z.number().min(0).max(1);

/** How right windows were. */
export const windowScore = z.object({
  cases: z.number().int(),
  held: z.number().int(),
  /** It fell due before the window. */
  sooner: z.number().int(),
  /** It fell due after the window. */
  later: z.number().int(),
  /** What was seen fits the window, but other days too. */
  open: z.number().int(),
  /** Of those whose due day was seen itself: the share that held, with its 95 % interval. */
  known: z.object({ n: z.number().int(), share, low: share, high: share }).nullable(),
  /** Likeliest shares of due days before the window, in its first half, its second half, after it. */
  parts: z.array(share).length(4),
  /** Median days from the window's middle to the due day; positive = later than said. */
  medianMissDays: z.number().nullable(),
});
export type WindowScore = z.infer<typeof windowScore>;

/** When a window was told: right after the treatment, and so long before the next visit. */
export const horizons = ['at-treatment', 'two-weeks', 'one-week'] as const;
export type Horizon = (typeof horizons)[number];
const judgedKinds = [...treatmentKinds, 'replacement'] as const;

/** GET /api/accuracy: windows told in the last year against what was found at the bench. */
export const accuracy = z.object({
  horizons: z.array(z.object({ horizon: z.enum(horizons), score: windowScore })),
  /** As told two weeks before, by the treatment judged; chains replaced as worn beside them. */
  kinds: z.array(z.object({ kind: z.enum(judgedKinds), score: windowScore })),
  /** The newest at most 20, as told two weeks before. */
  latest: z.array(
    z.object({
      chainId: id,
      label: z.string(),
      riderName: z.string(),
      kind: z.enum(judgedKinds),
      toldOn: day,
      p10: day.nullable(),
      p50: day.nullable(),
      p90: day.nullable(),
      /** The day it was looked at, and whether it had fallen due before, about then, or not yet. */
      day,
      seen: z.enum(['before', 'then', 'after']),
      verdict: z.enum(['held', 'sooner', 'later', 'open']),
    }),
  ),
});
export type Accuracy = z.infer<typeof accuracy>;
