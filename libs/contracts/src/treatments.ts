import { z } from 'zod';
import { day, id, notes, pageOf, pageQuery } from './common';
import { measurement } from './readings';
import { arrivalConditions, treatmentKinds } from './trade';

/** What can be done to a chain that is there; 'new-chain' is told by adding the chain, in service from that day. */
export const treatmentChoices = z.enum(treatmentKinds).exclude(['new-chain'], {
  message: 'A new chain is recorded by adding the chain, not as a treatment.',
});

/** POST /api/treatments: what was done, how the chain arrived, and optionally what was measured. */
export const treatmentInput = z.object({
  chainId: id,
  day,
  kind: treatmentChoices,
  arrival: z.enum(arrivalConditions),
  notes: notes.default(''),
  reading: measurement.nullable().default(null),
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
export type TreatmentQuery = z.infer<typeof treatmentQuery>;
