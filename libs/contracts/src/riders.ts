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
/** PUT /api/riders/:id/reminders: turns the letters to a rider on or off. */
export const reminderSwitch = z.object({ on: z.boolean() });
/** GET /api/riders/me: what a rider sees of themself; the workshop's notes are its own. */
export const riderSelf = rider.omit({ notes: true });
export type RiderSelf = z.infer<typeof riderSelf>;
/** PUT /api/riders/me */
export const riderSelfInput = riderInput
  .omit({ notes: true })
  .extend({ distanceUnit, remindersOn: z.boolean() });
export type RiderInput = z.infer<typeof riderInput>;
export type RiderSelfInput = z.infer<typeof riderSelfInput>;
export const riderPage = pageOf(rider);
export const riderQuery = pageQuery.extend({ search: z.string().trim().max(100).default('') });
export type RiderQuery = z.infer<typeof riderQuery>;
