import { z } from 'zod';
import { day } from './common';
import { bikeKinds, regimes, treatmentKinds } from './trade';

/** GET /api/model: what this workshop's estimates are worked out with, beside what every workshop starts from. */
export const estimationModel = z.object({
  /** The day of the last learning; null before the first. */
  learnedOn: day.nullable(),
  /** How long treatments last, counted km. */
  lives: z.array(
    z.object({
      kind: z.enum(treatmentKinds),
      start: z.number(),
      median: z.number(),
      /** Looks on arrival behind it; with none it is the start. */
      observations: z.number().int(),
      /** The median lies in between with a chance of 80 %; null where nothing was seen. */
      low: z.number().nullable(),
      high: z.number().nullable(),
    }),
  ),
  /** Lengthening, % per 1,000 counted km, where measured chains have taught it. */
  rates: z.array(
    z.object({
      regime: z.enum(regimes),
      bikeKind: z.enum(bikeKinds),
      start: z.number(),
      median: z.number(),
      chains: z.number().int(),
    }),
  ),
  /** Whose logs the riding ahead was learned from. */
  riding: z.object({ ownRiders: z.number().int(), shippedRiders: z.number().int() }),
});
export type EstimationModel = z.infer<typeof estimationModel>;
