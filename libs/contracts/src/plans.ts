import { z } from 'zod';
import { day, id, metres, pageOf, pageQuery, shortText } from './common';

/** Riding beside what is usual on a bike, on the days from..to, both included: 'a training week, 600 km'. */
export const planInput = z
  .object({
    bikeId: id,
    name: shortText('what is planned', 60),
    from: day,
    to: day,
    distanceM: metres('The planned distance', 20_000),
  })
  .refine(({ from, to }) => from <= to, { message: 'The last day is before the first.', path: ['to'] })
  .refine(({ from, to }) => Date.parse(to) - Date.parse(from) <= 366 * 86_400_000, {
    message: 'A plan lasts a year at most.',
    path: ['to'],
  });
export type PlanInput = z.infer<typeof planInput>;

const due = z.object({
  /** Chance that it is due before the plan begins, and by its last day. */
  before: z.number(),
  byEnd: z.number(),
});

/** What a plan does to the chain that is on the bike now. */
export const planOutlook = z.object({
  chainId: id,
  chainLabel: z.string(),
  lubrication: due,
  replacement: due,
  /** How many times over the plan uses a treatment up: its counted distance by the life that half of them reach. */
  treatments: z.number(),
  /** The last day to come in on before it begins, where it is advisable to; null where the chain should last. */
  comeInBy: day.nullable(),
});
export type PlanOutlook = z.infer<typeof planOutlook>;

export const plan = z.object({
  id,
  bikeId: id,
  bikeName: z.string(),
  name: z.string(),
  from: day,
  to: day,
  distanceM: z.number().int(),
  /** Null while no chain is on the bike or nothing is estimated yet. */
  outlook: planOutlook.nullable(),
});
export type Plan = z.infer<typeof plan>;
export const planPage = pageOf(plan);
/** GET /api/plans: those that are not over yet, the soonest first. */
export const planQuery = pageQuery.extend({ bikeId: id.optional(), riderId: id.optional() });
export type PlanQuery = z.infer<typeof planQuery>;
