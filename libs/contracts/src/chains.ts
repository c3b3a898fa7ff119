import { z } from 'zod';
import { day, id, pageOf, pageQuery, shortText } from './common';
import { regimes, retiredReasons } from './trade';
import { chainState } from './estimates';

export const chainInput = z.object({
  label: shortText('a label for the chain', 40),
  speeds: z.number().int().min(1).max(14),
  regime: z.enum(regimes),
  /** Elongation at which it must be replaced, %; null = by speeds (0.5 from 11, 0.75 from 6, 1.0 below). */
  wearLimitPct: z
    .number()
    .min(0.1, 'A limit is at least 0.1 %.')
    .max(3, 'A limit is at most 3 %.')
    .nullable(),
  inServiceOn: day,
});
/** POST /api/chains: with bikeId it is fitted at once. */
export const newChain = chainInput.extend({ riderId: id, bikeId: id.nullable() });

export type ChainInput = z.infer<typeof chainInput>;
export type NewChain = z.infer<typeof newChain>;

export const chain = chainInput.extend({
  id,
  riderId: id,
  riderName: z.string(),
  /** Whether its rider takes reminders. */
  remindersOn: z.boolean(),
  /** The bike it is on now; null in the box. */
  bikeId: id.nullable(),
  bikeName: z.string().nullable(),
  /** The limit that holds, %. */
  limitPct: z.number(),
  retiredOn: day.nullable(),
  retiredBecause: z.enum(retiredReasons).nullable(),
  state: chainState.nullable(),
});
export type Chain = z.infer<typeof chain>;
export const chainPage = pageOf(chain);
export const chainQuery = pageQuery.extend({
  riderId: id.optional(),
  bikeId: id.optional(),
  /** 'soonest' puts the chain due first at the top. */
  order: z.enum(['label', 'soonest']).default('label'),
  retired: z.enum(['no', 'yes']).default('no'),
  search: z.string().trim().max(100).default(''),
});
export type ChainQuery = z.infer<typeof chainQuery>;

/** POST /api/chains/:id/fit: puts it on a bike from that day; the chain on it goes into the box. */
export const fitChain = z.object({ bikeId: id, day });
/** POST /api/chains/:id/box: that day was its last on the bike. */
export const boxChain = z.object({ day });
/** POST /api/chains/:id/retire; POST /api/chains/:id/return (no body) takes it back. */
export const retireChain = z.object({ day, because: z.enum(retiredReasons) });
/** GET /api/chains/:id/fittings */
export const fitting = z.object({
  id,
  chainId: id,
  bikeId: id,
  bikeName: z.string(),
  from: day,
  to: day.nullable(),
});
export type Fitting = z.infer<typeof fitting>;
export const fittingPage = pageOf(fitting);
/** PUT /api/fittings/:id corrects one; rides follow it to the chain that was on the bike that day. */
export const fittingInput = z
  .object({ bikeId: id, from: day, to: day.nullable() })
  .refine((f) => f.to === null || f.from <= f.to, {
    message: 'The last day is before the first.',
    path: ['to'],
  });
export type FittingInput = z.infer<typeof fittingInput>;
export type FitChain = z.infer<typeof fitChain>;
export type RetireChain = z.infer<typeof retireChain>;
