import { z } from 'zod';
import { day, id, notes, pageOf, pageQuery } from './common';
import { readingMethods } from './trade';

const elongation = z
  .number('Elongation is a number in %.')
  .min(-0.3, 'A chain that reads shorter than −0.3 % was measured wrongly: measure again under tension.')
  .max(3, 'Over 3 % no chain would still run: check the figure.');

/** A number reading has 1 to 5 places (% elongation); a go/no-go reading has what goes and what does not. */
export const readingInput = z
  .object({
    chainId: id,
    day,
    method: z.enum(readingMethods),
    values: z.array(elongation).min(1).max(5).nullable(),
    /** The step that goes in: elongation is above it. */
    lower: elongation.nullable(),
    /** The step that does not go in: elongation is below it. */
    upper: elongation.nullable(),
    baseline: z.boolean().default(false),
    notes: notes.default(''),
  })
  .refine((r) => r.values !== null || r.lower !== null || r.upper !== null, {
    message: 'Enter what the tool shows.',
    path: ['values'],
  })
  .refine((r) => r.values === null || (r.lower === null && r.upper === null), {
    message: 'Enter either a figure or what goes and does not go.',
    path: ['values'],
  })
  .refine((r) => r.lower === null || r.upper === null || r.lower < r.upper, {
    message: 'The step that does not go in must be larger than the one that goes.',
    path: ['upper'],
  });
export type ReadingInput = z.infer<typeof readingInput>;
export const reading = z.object({
  id,
  chainId: id,
  day,
  method: z.enum(readingMethods),
  values: z.array(z.number()).nullable(),
  lower: z.number().nullable(),
  upper: z.number().nullable(),
  baseline: z.boolean(),
  notes: z.string(),
  by: z.string(),
});
export type Reading = z.infer<typeof reading>;
export const readingPage = pageOf(reading);
export const readingQuery = pageQuery.extend({ chainId: id });
