import type { Reminder as WireReminder } from '@halfpitch/contracts';

/** A reminder's state follows from its letter's: it is not kept twice. */
export const REMINDER_STATE = `case
  when mail.state = 'sent' and reminder.closed_at is null then 'sent'
  when mail.state = 'failed' then 'failed'
  when reminder.closed_at is not null then 'closed'
  when reminder.held then 'held'
  else 'waiting' end`;

export const REMINDER_COLUMNS = `
  reminder.id, reminder.chain_id as "chainId", chain.label as "chainLabel", reminder.rider_id as "riderId",
  rider.name as "riderName", coalesce(mail.to_address, rider.email) as email, bike.name as "bikeName", reminder.kind,
  ${REMINDER_STATE} as state, reminder.p10::text, reminder.p50::text, reminder.p90::text,
  reminder.created_at as "createdAt", mail.sent_at as "sentAt", coalesce(mail.attempts, 0) as attempts,
  mail.last_error as "lastError"`;

export const REMINDER_FROM = `reminder
  join chain on chain.id = reminder.chain_id
  join rider on rider.id = reminder.rider_id
  left join fitting on fitting.chain_id = chain.id and fitting.to_day is null
  left join bike on bike.id = fitting.bike_id
  left join mail on mail.id = reminder.mail_id`;

export interface ReminderRow extends Omit<WireReminder, 'window' | 'createdAt' | 'sentAt'> {
  p10: string | null;
  p50: string | null;
  p90: string | null;
  createdAt: Date;
  sentAt: Date | null;
}

export function toReminder({ p10, p50, p90, createdAt, sentAt, ...row }: ReminderRow): WireReminder {
  return {
    ...row,
    window: { p10, p50, p90 },
    createdAt: createdAt.toISOString(),
    sentAt: sentAt && sentAt.toISOString(),
  };
}
