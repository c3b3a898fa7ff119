import { Injectable } from '@nestjs/common';
import type { Page, Reminder as WireReminder, ReminderQuery, SendReminder } from '@halfpitch/contracts';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { conflict, notFound } from '../common/problems';
import { Conditions, pageOfSql } from '../common/sql-page';
import { TenantDb } from '../database/tenant-db';
import { EstimatesService } from '../estimates/estimates.service';
import { MailService } from '../mail/mail.service';
import { WorkshopService } from '../workshop/workshop.service';
import {
  IN_STATE,
  REMINDER_COLUMNS,
  REMINDER_FROM,
  REMINDER_ORDER,
  ReminderRow,
  toReminder,
} from './reminder-list';
import { cycleOf, ReminderWriter } from './reminder-writer.service';
import { Reminder } from './reminder.entity';
import { whyNotAgain, whyNotTo } from './reminders.policy';
import { subjectsOf } from './subjects';

/** What the desk does about reminders by hand. */
@Injectable()
export class RemindersService {
  constructor(
    private readonly db: TenantDb,
    private readonly workshops: WorkshopService,
    private readonly estimates: EstimatesService,
    private readonly mail: MailService,
    private readonly writer: ReminderWriter,
    private readonly clock: Clock,
  ) {}

  async list({ state, chainId, ...paging }: ReminderQuery): Promise<Page<WireReminder>> {
    const { where, values } = new Conditions().add(IN_STATE, state).add('reminder.chain_id = ?', chainId);
    const list = { columns: REMINDER_COLUMNS, from: REMINDER_FROM, where, values, order: REMINDER_ORDER };
    const page = await pageOfSql<ReminderRow>(this.db.manager, list, paging);
    return { ...page, items: page.items.map(toReminder) };
  }

  /** Sends a chain's reminder of this cycle now, or holds it before the scheduler writes it. */
  async send(actor: Actor, { chainId, kind, again, hold }: SendReminder): Promise<WireReminder> {
    const draft = await this.draft(chainId, kind);
    const workshop = await this.workshops.current(actor.workshopId);
    const claimed = await this.writer.claim(workshop, draft, hold);
    const id = claimed ?? (await this.existing(kind, cycleOf(kind, draft.subject), chainId));
    if (hold) return claimed ? this.read(id) : this.hold(id);
    const wrong = claimed ? null : whyNotAgain((await this.read(id)).state, again);
    if (wrong) throw conflict(wrong);
    await this.writer.write(id, workshop, draft, this.clock.today(actor.timeZone));
    return this.read(id);
  }

  /** Keeps a reminder from being sent: its letter leaves the outbox. */
  async hold(id: string): Promise<WireReminder> {
    const reminder = await this.lock(id);
    const { state } = await this.read(id);
    if (state === 'sent' || state === 'closed')
      throw conflict(`It is ${state} already: there is nothing to hold.`);
    if (state === 'waiting' && reminder.mailId && !(await this.mail.withdraw(reminder.mailId)))
      throw conflict('It is being sent at this moment.');
    await this.db.manager.update(Reminder, id, { held: true });
    return this.read(id);
  }

  /** Lets a held reminder go: its letter is written anew, from the estimate of today. */
  async release(actor: Actor, id: string): Promise<WireReminder> {
    const { chainId, kind } = await this.lock(id);
    if ((await this.read(id)).state !== 'held') throw conflict('It is not held.');
    const draft = await this.draft(chainId, kind);
    const workshop = await this.workshops.current(actor.workshopId);
    await this.writer.write(id, workshop, draft, this.clock.today(actor.timeZone));
    return this.read(id);
  }

  private async draft(chainId: string, kind: Reminder['kind']) {
    const [subject] = await subjectsOf(this.db.manager, [chainId]);
    if (!subject) throw notFound('chain');
    const estimate = await this.estimates.newest(chainId);
    const wrong = whyNotTo(kind, subject, estimate?.detail);
    if (wrong || !estimate) throw conflict(wrong ?? 'This chain is being estimated. Try again in a moment.');
    return { kind, subject, detail: estimate.detail };
  }

  private async existing(kind: Reminder['kind'], cycle: string, chainId: string): Promise<string> {
    const { id } = await this.db.manager.findOneByOrFail(Reminder, { chainId, kind, cycle });
    await this.lock(id);
    return id;
  }

  private async lock(id: string): Promise<Reminder> {
    const lock = { mode: 'pessimistic_write' } as const;
    const reminder = await this.db.manager.findOne(Reminder, { where: { id }, lock });
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
