import { Injectable, OnModuleDestroy } from '@nestjs/common';
import { ConfigService } from '@nestjs/config';
import { createTransport } from 'nodemailer';
import { Environment } from '../config/environment';
import type { Mail } from './mail.entity';

/** The one way out: an SMTP server, by nodemailer. */
@Injectable()
export class MailTransport implements OnModuleDestroy {
  private readonly from: string;
  private readonly transport;

  constructor(config: ConfigService<Environment, true>) {
    this.from = config.get('MAIL_FROM');
    this.transport = createTransport(config.get<string>('SMTP_URL'), {
      pool: true,
      connectionTimeout: 10_000,
      greetingTimeout: 10_000,
      socketTimeout: 20_000,
    } as object);
  }

  /** @throws the SMTP server's refusal, or the failure to reach it. */
  async send(mail: Mail): Promise<void> {
    await this.transport.sendMail({
      from: this.from,
      to: mail.toAddress,
      subject: mail.subject,
      text: mail.text,
      html: mail.html,
      headers: mail.headers,
      messageId: `<${mail.id}@${this.domain()}>`,
    });
  }

  onModuleDestroy(): void {
    this.transport.close();
  }

  private domain(): string {
    return /@([^>\s]+)/.exec(this.from)?.[1] ?? 'localhost';
  }
}
