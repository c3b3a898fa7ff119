import { Injectable } from '@nestjs/common';
import type { Page, Reminder as WireReminder, ReminderQuery, SendReminder } from '@halfpitch/contracts';
import { ChainsService } from '../chains/chains.service';
import type { Actor } from '../common/actor';
import { conflict, notFound } from '../common/problems';
import { Conditions, pageOfSql } from '../common/sql-page';
import { TenantDb } from '../database/tenant-db';
import { EstimatesService } from '../estimates/estimates.service';
import { MailService } from '../mail/mail.service';
import { Reminder } from './reminder.entity';
import { WorkshopService } from '../workshop/workshop.service';
import { REMINDER_COLUMNS, REMINDER_FROM, REMINDER_STATE, ReminderRow, toReminder } from './reminder-list';
import { WriteReminderService } from './write-reminder.service';

@Injectable()
export class RemindersService {
  constructor(
    private readonly db: TenantDb,
    private readonly chains: ChainsService,
    private readonly estimates: EstimatesService,
    private readonly workshop: WorkshopService,
    private readonly writing: WriteReminderService,
    private readonly mail: MailService,
  ) {}

  async list({ state, chainId, ...paging }: ReminderQuery): Promise<Page<WireReminder>> {
    const { where, values } = new Conditions()
      .add(`${REMINDER_STATE} = ?`, state)
      .add('reminder.chain_id = ?', chainId);
    const list = { columns: REMINDER_COLUMNS, from: REMINDER_FROM, where, values, order: 'reminder.id desc' };
    const page = await pageOfSql<ReminderRow>(this.db.manager, list, paging);
    return { ...page, items: page.items.map(toReminder) };
  }

  /** The desk writes at once. @throws 409 when this cycle's letter is written already, or the rider wants none. */
  async send(actor: Actor, { chainId, kind }: SendReminder): Promise<WireReminder> {
    const { riderId } = await this.chains.reach(actor, chainId);
    const { madeAt: _, id: __, ...detail } = await this.estimates.current(actor, chainId);
    const workshop = await this.workshop.current(actor.workshopId);
    const weekly = { lubrication: null, replacement: [] };
    const fresh = { workshop, chainId, riderId, madeOn: '', detail: { ...detail, weekly } };
    const id = await this.writing.write(fresh, kind);
    if (!id) throw conflict('This rider has had that reminder already, or has asked for no letters.');
    return this.read(id);
  }

  /** Keeps a letter that has not left from leaving. */
  async hold(id: string): Promise<WireReminder> {
    const reminder = await this.find(id);
    if (!reminder.mailId || !(await this.mail.withhold(reminder.mailId))) {
      throw conflict('This letter has left already; it can no longer be held.');
    }
    await this.db.manager.update(Reminder, id, { held: true });
    return this.read(id);
  }

  /** Lets a held letter go. */
  async release(id: string): Promise<WireReminder> {
    const reminder = await this.find(id);
    if (!reminder.held || !reminder.mailId) throw conflict('This letter is not held.');
    await this.db.manager.update(Reminder, id, { held: false });
    await this.mail.letGo(reminder.mailId, { workshopId: reminder.workshopId });
    return this.read(id);
  }

  private async find(id: string): Promise<Reminder> {
    const reminder = await this.db.manager.findOneBy(Reminder, { id });
    if (!reminder) throw notFound('reminder');
    return reminder;
  }

  private async read(id: string): Promise<WireReminder> {
    const [row] = await this.db.manager.query<ReminderRow[]>(
      `select ${REMINDER_COLUMNS} from ${REMINDER_FROM} where reminder.id = $1`,
      [id],
    );
    return toReminder(row!);
  }
}
