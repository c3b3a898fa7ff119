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
});
export type Workload = z.infer<typeof workload>;
