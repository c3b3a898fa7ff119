import { z } from 'zod';
import { day, id, instant, pageOf, pageQuery } from './common';

export const reminderKinds = ['lubrication', 'replacement'] as const;
export const reminderStates = ['waiting', 'sent', 'failed', 'held', 'closed'] as const;
/** GET /api/reminders */
export const reminder = z.object({
  id,
  chainId: id,
  chainLabel: z.string(),
  riderId: id,
  riderName: z.string(),
  email: z.string(),
  bikeName: z.string().nullable(),
  kind: z.enum(reminderKinds),
  state: z.enum(reminderStates),
  window: z.object({ p10: day.nullable(), p50: day.nullable(), p90: day.nullable() }),
  createdAt: instant,
  sentAt: instant.nullable(),
  attempts: z.number().int(),
  lastError: z.string().nullable(),
});
export type Reminder = z.infer<typeof reminder>;
export const reminderPage = pageOf(reminder);
export const reminderQuery = pageQuery.extend({
  state: z.enum(reminderStates).optional(),
  chainId: id.optional(),
});
export type ReminderQuery = z.infer<typeof reminderQuery>;
/**
 * POST /api/reminders: the desk writes now, without waiting for the scheduler. One that was sent in this cycle is sent
 * a second time only with `again`; with `hold` none is sent until POST /api/reminders/:id/release.
 */
export const sendReminder = z.object({
  chainId: id,
  kind: z.enum(reminderKinds),
  again: z.boolean().default(false),
  hold: z.boolean().default(false),
});
export type SendReminder = z.infer<typeof sendReminder>;
/** GET, POST /api/stop/:token (public): stops the e-mails of one rider; POST with {on:true} turns them on again. */
export const stopView = z.object({ workshopName: z.string(), email: z.string(), remindersOn: z.boolean() });
/** From the page, or the one-click form of a mail program (RFC 8058), which can only stop them. */
export const stopChange = z.union([
  z.object({ on: z.boolean() }),
  z.object({ 'List-Unsubscribe': z.literal('One-Click') }).transform(() => ({ on: false })),
]);
export type StopChange = z.infer<typeof stopChange>;
export type StopView = z.infer<typeof stopView>;
