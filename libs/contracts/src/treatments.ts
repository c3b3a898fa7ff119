import { z } from 'zod';
import { day, id, notes, pageOf, pageQuery } from './common';
import { readingInput } from './readings';
import { arrivalConditions, treatmentKinds } from './trade';

/** POST /api/treatments: what was done, how the chain arrived, and optionally what was measured. */
export const treatmentInput = z.object({
  chainId: id,
  day,
  kind: z.enum(treatmentKinds),
  arrival: z.enum(arrivalConditions),
  notes: notes.default(''),
  reading: z
    .object({
      method: readingInput.shape.method,
      values: readingInput.shape.values,
      lower: readingInput.shape.lower,
      upper: readingInput.shape.upper,
    })
    .nullable()
    .default(null),
});
export type TreatmentInput = z.infer<typeof treatmentInput>;
export const treatment = z.object({
  id,
  chainId: id,
  day,
  kind: z.enum(treatmentKinds),
  arrival: z.enum(arrivalConditions),
  notes: z.string(),
  by: z.string(),
});
export type Treatment = z.infer<typeof treatment>;
export const treatmentPage = pageOf(treatment);
export const treatmentQuery = pageQuery.extend({ chainId: id });
