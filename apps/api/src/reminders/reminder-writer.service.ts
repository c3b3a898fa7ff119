import { Injectable } from '@nestjs/common';
import { ConfigService } from '@nestjs/config';
import { v7 } from 'uuid';
import { Environment } from '../config/environment';
import { TenantDb } from '../database/tenant-db';
import type { EstimateDetail } from '../estimates/estimate.entity';
import { MailService } from '../mail/mail.service';
import type { Workshop } from '../workshop/workshop.entity';
import type { Reminder } from './reminder.entity';
import { reminderLetter } from './reminder-letter';
import type { Subject } from './subjects';

export interface ReminderDraft {
  kind: Reminder['kind'];
  subject: Subject;
  detail: EstimateDetail;
}

/** The cycle a chain is in: the treatment that runs out, or the chain's own life. One reminder of a kind belongs to it. */
export const cycleOf = (
  kind: Reminder['kind'],
  { chainId, lastTreatmentId, inServiceOn }: Pick<Subject, 'chainId' | 'lastTreatmentId' | 'inServiceOn'>,
): string => (kind === 'replacement' ? chainId : (lastTreatmentId ?? inServiceOn));

/** Writes reminders and their letters, both in the transaction under way or neither. */
@Injectable()
export class ReminderWriter {
  constructor(
    private readonly db: TenantDb,
    private readonly mail: MailService,
    private readonly config: ConfigService<Environment, true>,
  ) {}

  /** Notes the reminder down for its cycle; null where there is one already, whoever else tries at this moment. */
  async claim({ id: workshopId }: Workshop, draft: ReminderDraft, held = false): Promise<string | null> {
    const { kind, subject } = draft;
    const window = draft.detail[kind];
    const rows = await this.db.manager.query<{ id: string }[]>(
      `insert into reminder (id, workshop_id, chain_id, rider_id, kind, cycle, held, p10, p50, p90)
       values ($1, $2, $3, $4, $5, $6, $7, $8, $9, $10)
       on conflict (chain_id, kind, cycle) do nothing returning id`,
      [
        v7(),
        workshopId,
        subject.chainId,
        subject.riderId,
        kind,
        cycleOf(kind, subject),
        held,
        ...[window?.p10 ?? null, window?.p50 ?? null, window?.p90 ?? null],
      ],
    );
    return rows[0]?.id ?? null;
  }

  /** Writes the letter of a reminder, from the newest estimate, and has it sent after the commit. */
  async write(reminderId: string, workshop: Workshop, draft: ReminderDraft, today: string): Promise<void> {
    const { kind, subject, detail } = draft;
    const window = detail[kind];
    if (!window) throw new Error('A chain in the box has no window to write about.');
    const publicUrl = this.config.get<string>('PUBLIC_URL');
    const letter = reminderLetter({ kind, subject, window, detail, workshop, today, publicUrl });
    const mailId = await this.mail.write(letter, { workshopId: workshop.id });
    const { p10, p50, p90 } = window;
    await this.db.manager.query(
      `update reminder set mail_id = $2, held = false, closed_at = null, p10 = $3, p50 = $4, p90 = $5 where id = $1`,
      [reminderId, mailId, p10, p50, p90],
    );
  }
}
