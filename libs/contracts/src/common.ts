import { z } from 'zod';

export const id = z.uuid();
/** A calendar day in the workshop's time zone, YYYY-MM-DD. */
export const day = z.iso.date('Give the day as year-month-day.');
/** An instant, ISO 8601 with time zone. */
export const instant = z.iso.datetime({ offset: true });
export const email = z.string().trim().toLowerCase().pipe(z.email('That is not an e-mail address.'));
export const shortText = (what: string, max = 120) =>
  z.string().trim().min(1, `Give ${what}.`).max(max, `${what} is at most ${max} characters.`);
export const notes = z.string().trim().max(4000, 'At most 4,000 characters.');

/** Metres; a single ride or odometer beyond 200,000 km is a slip of the keyboard. */
export const metres = (what: string, maxKm: number) =>
  z
    .number(`${what} is a number.`)
    .int()
    .min(0, `${what} can't be negative.`)
    .max(maxKm * 1000, `${what} is at most ${maxKm.toLocaleString('en-GB')} km.`);

export const pageQuery = z.object({
  page: z.coerce.number().int().min(1).default(1),
  size: z.coerce.number().int().min(1).max(200).default(50),
});
export type PageQuery = z.infer<typeof pageQuery>;

/** One page of a list: every list is paged. */
export const pageOf = <T extends z.ZodType>(item: T) =>
  z.object({ items: z.array(item), total: z.number().int(), page: z.number().int(), size: z.number().int() });
export interface Page<T> {
  items: T[];
  total: number;
  page: number;
  size: number;
}

/** RFC 9457 problem details. */
export const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
});
export type Problem = z.infer<typeof problem>;

/** What deleting and other calls without content answer. */
export const done = z.object({ done: z.literal(true) });
export type Done = z.infer<typeof done>;
