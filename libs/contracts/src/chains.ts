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

export const chain = chainInput.extend({
  id,
  riderId: id,
  riderName: z.string(),
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
/** POST /api/chains/:id/box */
export const boxChain = z.object({ day });
/** POST /api/chains/:id/retire */
export const retireChain = z.object({ day, because: z.enum(retiredReasons) });
/** GET /api/chains/:id/fittings */
export const fitting = z.object({ id, bikeId: id, bikeName: z.string(), from: day, to: day.nullable() });
export type Fitting = z.infer<typeof fitting>;
export const fittingPage = pageOf(fitting);
