import type { Reminder } from '@halfpitch/contracts';

/** What became of a reminder, from its own marks and its letter's. */
const STATE = `case
  when mail.state = 'sent' and reminder.closed_at is null then 'sent'
  when reminder.closed_at is not null then 'closed'
  when reminder.held then 'held'
  when mail.state = 'failed' then 'failed'
  else 'waiting' end`;

export const REMINDER_COLUMNS = `
  reminder.id, reminder.chain_id as "chainId", chain.label as "chainLabel", reminder.rider_id as "riderId",
  rider.name as "riderName", rider.email, bike.name as "bikeName", reminder.kind, ${STATE} as state,
  reminder.p10::text, reminder.p50::text, reminder.p90::text, reminder.created_at as "createdAt",
  mail.sent_at as "sentAt", coalesce(mail.attempts, 0) as attempts, mail.last_error as "lastError"`;

export const REMINDER_FROM = `reminder
  join chain on chain.id = reminder.chain_id
  join rider on rider.id = reminder.rider_id
  left join fitting on fitting.chain_id = chain.id and fitting.to_day is null
  left join bike on bike.id = fitting.bike_id
  left join mail on mail.id = reminder.mail_id`;

export const REMINDER_ORDER = 'reminder.created_at desc, reminder.id desc';
export const IN_STATE = `(${STATE}) = ?`;

export interface ReminderRow extends Omit<Reminder, 'window' | 'createdAt' | 'sentAt'> {
  p10: string | null;
  p50: string | null;
  p90: string | null;
  createdAt: Date;
  sentAt: Date | null;
}

export function toReminder({ p10, p50, p90, createdAt, sentAt, ...row }: ReminderRow): Reminder {
  return {
    ...row,
    window: { p10, p50, p90 },
    createdAt: createdAt.toISOString(),
    sentAt: sentAt?.toISOString() ?? null,
  };
}
