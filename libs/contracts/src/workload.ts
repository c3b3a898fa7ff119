import { z } from 'zod';
import { day } from './common';

const band = z.object({ p10: z.number(), p50: z.number(), p90: z.number(), mean: z.number() });

/** GET /api/workload: the coming 12 weeks. */
export const workload = z.object({
  weeks: z.array(
    z.object({
      from: day,
      to: day,
      treatments: band,
      replacements: band,
      benchMinutes: band,
      potLoads: band,
      /** Chains that most likely fall due in it, likeliest first, at most 20. */
      chains: z.array(
        z.object({
          chainId: z.uuid(),
          label: z.string(),
          riderName: z.string(),
          kind: z.enum(['lubrication', 'replacement']),
          chance: z.number(),
        }),
      ),
    }),
  ),
  minutesPerWeek: z.number(),
  /** What past reminders teach about when riders come who are due. */
  coming: z.object({
    /** Chance that a rider who is due comes within a week. */
    chancePerWeek: z.number(),
    /** Reminders sent at least three weeks ago, and those followed by a treatment within three weeks. */
    reminders: z.number().int(),
    cameInThreeWeeks: z.number().int(),
  }),
});
export type Workload = z.infer<typeof workload>;
