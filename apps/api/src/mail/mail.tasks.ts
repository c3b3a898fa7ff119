import { Injectable, Logger, OnModuleInit } from '@nestjs/common';
import { Clock } from '../common/clock';
import { TenantDb } from '../database/tenant-db';
import { QueueService } from '../jobs/queue.service';
import { QUEUES, Tasks } from '../jobs/tasks';
import { Mail } from './mail.entity';
import { mayHaveArrived } from './may-have-arrived';
import { MailTransport } from './transport';

const UNCLEAR =
  'The connection ended while it was being sent: it may have arrived. It is not sent a second time by itself.';

/**
 * Sends letters at most once each. A letter is marked 'sending' before the dialogue begins; one found so marked later
 * met a crash in between and is not sent again, since nobody knows whether it arrived.
 */
@Injectable()
export class MailTasks implements OnModuleInit {
  private readonly logger = new Logger(MailTasks.name);

  constructor(
    private readonly db: TenantDb,
    private readonly queue: QueueService,
    private readonly transport: MailTransport,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.queue.handle('send-mail', (task) => this.sendMail(task));
  }

  /** @throws what the SMTP server said, for the queue to try again later. */
  async sendMail({ mailId, ...scope }: Tasks['send-mail']): Promise<void> {
    const mail = await this.db.run(scope, () => this.claim(mailId));
    if (!mail) return;
    try {
      await this.transport.send(mail);
    } catch (error) {
      const unclear = mayHaveArrived(error);
      const over = unclear || mail.attempts >= QUEUES['send-mail'].retryLimit;
      const lastError = unclear ? UNCLEAR : (error as Error).message;
      await this.db.run(scope, () =>
        this.db.manager.update(Mail, mailId, { state: over ? 'failed' : 'waiting', lastError }),
      );
      this.logger.warn(`Letter ${mailId} was not sent: ${lastError}`);
      if (unclear) return;
      throw error;
    }
    const sent = { state: 'sent' as const, sentAt: this.clock.now(), lastError: null, text: '', html: '' };
    await this.db.run(scope, () => this.db.manager.update(Mail, mailId, sent));
  }

  private async claim(mailId: string): Promise<Mail | null> {
    const mail = await this.db.manager.findOne(Mail, {
      where: { id: mailId },
      lock: { mode: 'pessimistic_write' },
    });
    if (!mail) return null;
    if (mail.state === 'sending')
      await this.db.manager.update(Mail, mailId, { state: 'failed', lastError: UNCLEAR });
    if (mail.state !== 'waiting') return null;
    await this.db.manager.update(Mail, mailId, { state: 'sending', attempts: mail.attempts + 1 });
    return mail;
  }
}
