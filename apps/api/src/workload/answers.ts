import type { Answer } from '@halfpitch/estimation';
import type { EntityManager } from 'typeorm';

const THREE_WEEKS = 21;

interface AgedAnswer extends Answer {
  /** Days since the reminder was sent. */
  ago: number;
}

/** What became of the treatment reminders that were sent in the last two years: days until the chain's next treatment, or until today. */
export function answers(manager: EntityManager, today: string): Promise<AgedAnswer[]> {
  return manager.query<AgedAnswer[]>(
    `select coalesce(visit.day, $1::date) - mail.sent_at::date as days, visit.day is not null as came,
            $1::date - mail.sent_at::date as ago
       from reminder
       join mail on mail.id = reminder.mail_id and mail.state = 'sent'
       left join lateral (
         select day from treatment
          where treatment.chain_id = reminder.chain_id and treatment.day >= mail.sent_at::date
          order by day limit 1) visit on true
      where reminder.kind = 'lubrication' and mail.sent_at::date between $1::date - 730 and $1::date
      order by mail.sent_at, reminder.id`,
    [today],
  );
}

/** Of the reminders old enough to tell, how many were followed by a treatment within three weeks. */
export function summary(answered: readonly AgedAnswer[]) {
  const old = answered.filter(({ ago }) => ago >= THREE_WEEKS);
  return {
    reminders: old.length,
    cameInThreeWeeks: old.filter(({ days, came }) => came && days <= THREE_WEEKS).length,
  };
}
