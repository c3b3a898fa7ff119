import { z } from 'zod';
import { day, id, notes, pageOf, pageQuery } from './common';
import { readingMethods } from './trade';

const elongation = z
  .number('Elongation is a number in %.')
  .min(-0.3, 'A chain that reads shorter than −0.3 % was measured wrongly: measure again under tension.')
  .max(3, 'Over 3 % no chain would still run: check the figure.');

const measurementShape = z.object({
  method: z.enum(readingMethods),
  values: z.array(elongation).min(1).max(5).nullable(),
  /** The step that goes in: elongation is above it. */
  lower: elongation.nullable(),
  /** The step that does not go in: elongation is below it. */
  upper: elongation.nullable(),
});
type Measurement = z.infer<typeof measurementShape>;

/** What must hold of any measurement, as [condition that is wrong, field, sentence]. */
const measurementRules = ({ method, values, lower, upper }: Measurement): [boolean, string, string][] => [
  [values === null && lower === null && upper === null, 'values', 'Enter what the tool shows.'],
  [
    values !== null && (lower !== null || upper !== null),
    'values',
    'Enter either a figure or what goes and does not go.',
  ],
  [
    method === 'drop-in' && values !== null,
    'values',
    'A drop-in gauge shows what goes in and what does not, not a figure.',
  ],
  [
    lower !== null && upper !== null && lower >= upper,
    'upper',
    'The step that does not go in must be larger than the one that goes.',
  ],
];
const holdToRules = (measured: Measurement, context: z.RefinementCtx) => {
  for (const [wrong, field, message] of measurementRules(measured))
    if (wrong) context.addIssue({ code: 'custom', path: [field], message });
};

/** A number reading has 1 to 5 places (% elongation); a go/no-go reading has what goes and what does not. */
export const measurement = measurementShape.superRefine(holdToRules);
/** POST /api/readings may carry an Idempotency-Key header: sent twice, it is kept once. */
export const readingInput = measurementShape
  .extend({ chainId: id, day, baseline: z.boolean().default(false), notes: notes.default('') })
  .superRefine(holdToRules);
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
export type ReadingQuery = z.infer<typeof readingQuery>;
