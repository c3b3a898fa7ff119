import { arrivalConditions, readingMethods, treatmentChoices, treatmentInput } from '@halfpitch/contracts';
import type { ReadingMethod } from '@halfpitch/contracts';
import { z } from 'zod';

/** 'none' when nothing was measured. */
export const measuredWith = ['none', ...readingMethods] as const;

/** What goes in and what does not, by the steps that drop-in gauges have: 0.5, 0.75 and 1.0 % (practice). */
export const dropInSteps = [
  { value: 'below', label: '0.5 does not go in', lower: null, upper: 0.5 },
  { value: 'half', label: '0.5 goes in, 0.75 does not', lower: 0.5, upper: 0.75 },
  { value: 'three', label: '0.75 goes in, 1.0 does not', lower: 0.75, upper: 1 },
  { value: 'above', label: '1.0 goes in', lower: 1, upper: null },
] as const;

interface Draft {
  method: 'none' | ReadingMethod;
  values: (number | null)[];
  step: string | null;
}

function toReading({ method, values, step }: Draft) {
  if (method === 'none') return null;
  const none = { method, values: null, lower: null, upper: null };
  if (method === 'drop-in') {
    const chosen = dropInSteps.find(({ value }) => value === step);
    return { ...none, lower: chosen?.lower ?? null, upper: chosen?.upper ?? null };
  }
  const given = values.filter((value) => value !== null);
  return { ...none, values: given.length > 0 ? given : null };
}

/** The bench's form as filled in, turned into what the contract takes and held against it. */
export const treatmentForm = z
  .object({
    chainId: z.string(),
    day: z.string('Give the day.'),
    kind: treatmentChoices,
    arrival: z.enum(arrivalConditions, 'Say how the chain arrived.'),
    notes: z.string(),
    reading: z.object({
      method: z.enum(measuredWith),
      values: z.array(z.number().or(z.nan()).nullable()),
      step: z.string().nullable(),
    }),
  })
  .transform(({ reading, ...rest }): z.input<typeof treatmentInput> => ({
    ...rest,
    reading: toReading(reading),
  }))
  .pipe(treatmentInput);
export type TreatmentForm = z.input<typeof treatmentForm>;
