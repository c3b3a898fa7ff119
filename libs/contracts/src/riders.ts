import { z } from 'zod';
import { distanceUnit } from './accounts';
import { email, id, notes, pageOf, pageQuery, shortText } from './common';

export const riderInput = z.object({
  name: shortText('the rider’s name'),
  email,
  phone: z.string().trim().max(40).default(''),
  notes: notes.default(''),
});
/** GET /api/riders, /api/riders/:id; POST, PUT. */
export const rider = z.object({
  id,
  name: z.string(),
  email: z.string(),
  phone: z.string(),
  notes: z.string(),
  distanceUnit,
  /** Has an account; 'invited' while the invitation is open. */
  access: z.enum(['none', 'invited', 'joined']),
  remindersOn: z.boolean(),
  bikes: z.number().int(),
  chains: z.number().int(),
});
export type Rider = z.infer<typeof rider>;
export const riderPage = pageOf(rider);
export const riderQuery = pageQuery.extend({ search: z.string().trim().max(100).default('') });
export type RiderQuery = z.infer<typeof riderQuery>;
