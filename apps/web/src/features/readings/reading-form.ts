import type { ReadingInput, ReadingMethod } from '@halfpitch/contracts';
import { day, id, notes, readingInput, readingMethods } from '@halfpitch/contracts';
import { elongationFromInches, elongationPct } from '@halfpitch/estimation';
import { z } from 'zod';

/** How a tool's answer is entered: inch fractions, millimetres, percent, or what goes in. */
export const entries = ['inch', 'mm', 'pct', 'steps'] as const;
export type Entry = (typeof entries)[number];
export const entriesOf: Record<ReadingMethod, readonly [Entry, ...Entry[]]> = {
  'steel-rule': ['inch', 'mm'],
  'three-point': ['pct'],
  'two-point': ['pct'],
  digital: ['pct', 'mm'],
  'drop-in': ['steps'],
};
export const MOST_PLACES = 5;

const shape = z.object({
  chainId: id,
  day,
  baseline: z.boolean(),
  notes,
  method: z.enum(readingMethods),
  entry: z.enum(entries),
  /** Pitches that the millimetres span. */
  pitches: z
    .number('Give the number of pitches.')
    .int()
    .min(1, 'At least one pitch.')
    .max(120, 'At most 120 pitches.')
    .nullable(),
  /** Inches beyond the 12-inch line, as the list gives them; '' = not measured. */
  inches: z.array(z.string()),
  /** Millimetres or percent; null = not measured. */
  places: z.array(z.number('That is not a number.').nullable()),
  /** The step that goes in and the one that does not; '' = none. */
  goes: z.string(),
  stops: z.string(),
});
export type ReadingForm = z.input<typeof shape>;
export type Entered = Pick<
  ReadingForm,
  'method' | 'entry' | 'pitches' | 'inches' | 'places' | 'goes' | 'stops'
>;
type Measured = Pick<ReadingInput, 'values' | 'lower' | 'upper'>;

const step = (text: string) => (text === '' ? null : Number(text));

/** Elongation in % at each place that was measured, with the place's number. @throws when a length cannot be one of a chain. */
function atPlaces({ entry, pitches, inches, places }: Entered): { place: number; pct: number }[] {
  if (entry === 'inch')
    return inches.flatMap((text, place) =>
      text === '' ? [] : [{ place, pct: elongationFromInches(Number(text)) }],
    );
  return places.flatMap((value, place) => {
    if (value === null || value === undefined) return [];
    return [{ place, pct: entry === 'mm' ? elongationPct(value, pitches ?? NaN) : value }];
  });
}

/** What was entered as elongation; null while it is not a measurement yet. */
export function measured(entered: Entered): Measured | null {
  if (entered.entry === 'steps') {
    const [lower, upper] = [step(entered.goes), step(entered.stops)];
    return lower === null && upper === null ? null : { values: null, lower, upper };
  }
  try {
    const values = atPlaces(entered).map(({ pct }) => Math.round(pct * 1000) / 1000);
    return values.length > 0 && values.every(Number.isFinite) ? { values, lower: null, upper: null } : null;
  } catch {
    return null;
  }
}

const SPAN = 'That is no length of so many pitches: a new chain has 12.7 mm to each.';

function misread(form: Entered): { path: (string | number)[]; message: string } | null {
  const list = form.entry === 'inch' ? 'inches' : 'places';
  for (const [place, value] of form.places.entries())
    if (form.entry === 'mm' && value !== null && !measured({ ...form, places: [value] }))
      return { path: ['places', place], message: SPAN };
  if (measured(form)) return null;
  return { path: form.entry === 'steps' ? ['goes'] : [list, 0], message: 'Enter what the tool shows.' };
}

/** The field of the form that a complaint of the contract is about. */
function fieldOf(form: Entered, [name, index]: readonly PropertyKey[]): (string | number)[] {
  if (name === 'lower') return ['goes'];
  if (name === 'upper') return ['stops'];
  if (name !== 'values') return [String(name)];
  if (form.entry === 'steps') return ['goes'];
  const list = form.entry === 'inch' ? 'inches' : 'places';
  const place = typeof index === 'number' ? (orderOf(form)[index] ?? 0) : 0;
  return [list, place];
}
const orderOf = (form: Entered) => atPlaces(form).map(({ place }) => place);

/** The form as what is sent: the contract's rules hold, its complaints stand at the form's fields. */
export const readingForm = shape.transform((form, context): ReadingInput => {
  const wrong = misread(form);
  if (wrong) {
    context.addIssue({ code: 'custom', ...wrong });
    return z.NEVER;
  }
  const { chainId, day, method, baseline, notes } = form;
  const parsed = readingInput.safeParse({ chainId, day, method, baseline, notes, ...measured(form) });
  if (parsed.success) return parsed.data;
  for (const { path, message } of parsed.error.issues)
    context.addIssue({ code: 'custom', path: fieldOf(form, path), message });
  return z.NEVER;
});
