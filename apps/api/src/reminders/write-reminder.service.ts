import { Injectable } from '@nestjs/common';
import { ConfigService } from '@nestjs/config';
import type { Reminder as WireReminder } from '@halfpitch/contracts';
import { v7 } from 'uuid';
import { Environment } from '../config/environment';
import { TenantDb } from '../database/tenant-db';
import type { FreshEstimate } from '../estimates/estimate-chains.service';
import { MailService } from '../mail/mail.service';
import { reminderLetter } from './reminder-letter';
import { Reminder } from './reminder.entity';

type Kind = WireReminder['kind'];

interface Addressee {
  rider_id: string;
  rider_name: string;
  rider_email: string;
  reminders_on: boolean;
  stop_token: string;
  chain_label: string;
  bike_name: string | null;
  cycle: string;
}

/** Whom to write to, and which cycle a letter would belong to: the last treatment's, or the chain's own. */
const ADDRESSEE = `
  select rider.id as rider_id, rider.name as rider_name, rider.email as rider_email, rider.reminders_on, rider.stop_token,
         chain.label as chain_label, bike.name as bike_name,
         case when $2 = 'replacement' then chain.id::text else coalesce((
           select id::text from treatment where chain_id = chain.id order by day desc, id desc limit 1),
           chain.in_service_on::text) end as cycle
  from chain
  join rider on rider.id = chain.rider_id
  left join fitting on fitting.chain_id = chain.id and fitting.to_day is null
  left join bike on bike.id = fitting.bike_id
  where chain.id = $1 and chain.retired_on is null`;

/** Writes the letter and the row that says so, both or neither; a second one in the same cycle is impossible. */
@Injectable()
export class WriteReminderService {
  constructor(
    private readonly db: TenantDb,
    private readonly mail: MailService,
    private readonly config: ConfigService<Environment, true>,
  ) {}

  /** Returns the reminder's id, or null when this cycle has one already or the rider wants none. */
  async write({ workshop, chainId, detail }: FreshEstimate, kind: Kind): Promise<string | null> {
    const [to] = await this.db.manager.query<Addressee[]>(ADDRESSEE, [chainId, kind]);
    const window = detail[kind];
    if (!to?.reminders_on || !window) return null;
    const id = v7();
    const claimed = await this.db.manager.query<unknown[]>(
      `insert into reminder (id, workshop_id, chain_id, rider_id, kind, cycle, p10, p50, p90)
       values ($1, $2, $3, $4, $5, $6, $7, $8, $9) on conflict (chain_id, kind, cycle) do nothing returning id`,
      [id, workshop.id, chainId, to.rider_id, kind, to.cycle, window.p10, window.p50, window.p90],
    );
    if (claimed.length === 0) return null;
    const letter = reminderLetter({
      kind,
      window,
      detail,
      chainId,
      riderName: to.rider_name,
      riderEmail: to.rider_email,
      stopToken: to.stop_token,
      chainLabel: to.chain_label,
      bikeName: to.bike_name,
      workshopName: workshop.name,
      publicUrl: this.config.get('PUBLIC_URL'),
    });
    const mailId = await this.mail.write(letter, { workshopId: workshop.id });
    await this.db.manager.update(Reminder, id, { mailId });
    return id;
  }
}
