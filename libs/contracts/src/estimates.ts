import { z } from 'zod';
import { day, id, instant, pageOf, pageQuery } from './common';
import { readingMethods, treatmentKinds } from './trade';

const band = z.object({ p10: z.number(), p50: z.number(), p90: z.number() });
const chance = z.number().min(0).max(1);

/** A due window in calendar days; null = not within two years. */
export const dueWindow = z.object({
  p10: day.nullable(),
  p50: day.nullable(),
  p90: day.nullable(),
  chanceNow: chance,
  chanceWithin7: chance,
  chanceWithin14: chance,
  chanceWithin30: chance,
  decidedBy: z.enum(['distance', 'calendar']),
});
export type DueWindow = z.infer<typeof dueWindow>;

export const reasonCodes = [
  'riding-more',
  'riding-less',
  'wet-rides',
  'rough-rides',
  'reading',
  'treatment',
  'planned-riding',
  'unlogged-distance',
  'quiet-log',
  'calendar-limit',
  'first-estimate',
  'new-chain',
] as const;
export const reason = z.object({
  code: z.enum(reasonCodes),
  about: z.enum(['lubrication', 'replacement']),
  days: z.number(),
  data: z.record(z.string(), z.number()),
});
export type Reason = z.infer<typeof reason>;

export const alert = z.object({
  code: z.enum([
    'wet-ride-rust',
    'quiet-log',
    'past-limit',
    'doubted-reading',
    'doubted-arrival',
    'treatment-spent',
  ]),
  day,
  data: z.record(z.string(), z.union([z.number(), z.string()])),
});
export type Alert = z.infer<typeof alert>;

/** dryness word: fresh below 0.6 of the treatment used, turning to 1, dry beyond. */
export const dryness = z.enum(['fresh', 'turning', 'dry']);
export type Dryness = z.infer<typeof dryness>;

/** The short form that lists carry with each chain. */
export const chainState = z.object({
  madeAt: instant,
  shareUsed: z.number(),
  dryness,
  elongationPct: z.number(),
  chancePast: chance,
  lubrication: dueWindow.nullable(),
  replacement: dueWindow,
});
export type ChainState = z.infer<typeof chainState>;

/** GET /api/chains/:id/estimate */
export const chainEstimate = chainState.extend({
  id,
  chainId: id,
  wearKm: z.number(),
  totalKm: z.number(),
  unloggedKm: z.number(),
  kmPerWeek: band,
  treatment: z.object({
    kind: z.enum(treatmentKinds),
    since: day,
    lubeKmUsed: z.number(),
    life: band,
  }),
  elongation: z.object({
    now: band,
    rate: band,
    wearKmLeft: band,
    curve: z.array(band.extend({ day, wearKm: z.number() })),
    doubted: z.array(z.object({ readingId: id, because: z.string() })),
  }),
  reasons: z.array(reason),
  alerts: z.array(alert),
  narrows: z.object({ method: z.enum(readingMethods), factor: z.number() }).nullable(),
});
export type ChainEstimate = z.infer<typeof chainEstimate>;

/** GET /api/chains/:id/estimates: what was believed when. */
export const pastEstimate = z.object({
  id,
  madeAt: instant,
  shareUsed: z.number(),
  lubrication: dueWindow.nullable(),
  replacement: dueWindow,
});
export type PastEstimate = z.infer<typeof pastEstimate>;
export const pastEstimatePage = pageOf(pastEstimate);
export const pastEstimateQuery = pageQuery;
export type PastEstimateQuery = z.infer<typeof pastEstimateQuery>;

/** GET /api/chains/:id/usage: distance since the last treatment and before, for the chart. */
export const usage = z.object({
  /** One series per treatment cycle: metres ridden and lube metres, cumulative by day. */
  cycles: z.array(
    z.object({
      treatmentId: id.nullable(),
      kind: z.enum(treatmentKinds).nullable(),
      from: day,
      to: day.nullable(),
      points: z.array(z.object({ day, km: z.number(), lubeKm: z.number() })),
    }),
  ),
});
export type Usage = z.infer<typeof usage>;
