import { Injectable } from '@nestjs/common';
import type { Scope } from '../database/tenant-db';
import { TenantDb } from '../database/tenant-db';
import { QueueService } from '../jobs/queue.service';
import { Mail } from './mail.entity';

export interface Letter {
  to: string;
  subject: string;
  text: string;
  html: string;
  headers?: Record<string, string>;
}

/** Writes letters into the outbox, in the transaction under way; a task sends them after it commits. */
@Injectable()
export class MailService {
  constructor(
    private readonly db: TenantDb,
    private readonly queue: QueueService,
  ) {}

  async write(letter: Letter, scope: Scope): Promise<string> {
    const mail = Object.assign(new Mail(), {
      workshopId: scope.workshopId ?? null,
      accountId: scope.workshopId ? null : (scope.accountId ?? null),
      toAddress: letter.to,
      subject: letter.subject,
      text: letter.text,
      html: letter.html,
      headers: letter.headers ?? {},
    });
    await this.db.manager.insert(Mail, mail);
    await this.queue.send('send-mail', { mailId: mail.id, ...scope });
    return mail.id;
  }

  /** Takes a letter back; false when it has left or is leaving. */
  async withdraw(mailId: string): Promise<boolean> {
    const { affected } = await this.db.manager.delete(Mail, { id: mailId, state: 'waiting' });
    return affected === 1;
  }
}
