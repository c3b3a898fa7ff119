import { Injectable } from '@nestjs/common';
import { ConfigService } from '@nestjs/config';
import type { Actor } from '../common/actor';
import { unprocessable } from '../common/problems';
import { Environment } from '../config/environment';
import { TenantDb } from '../database/tenant-db';
import { MailService } from '../mail/mail.service';
import { Account } from './account.entity';
import { Directory } from './directory';
import { resetLetter } from './letters';
import { hashPassword, passwordFits } from './secrets';
import { SessionsService } from './sessions.service';
import { TokensService } from './tokens.service';

@Injectable()
export class PasswordsService {
  constructor(
    private readonly db: TenantDb,
    private readonly directory: Directory,
    private readonly tokens: TokensService,
    private readonly mail: MailService,
    private readonly sessions: SessionsService,
    private readonly config: ConfigService<Environment, true>,
  ) {}

  /** Writes a reset letter if the address has an account; whoever asks learns nothing either way. */
  async forgotten(email: string): Promise<void> {
    const found = await this.directory.accountForEmail(email);
    if (!found) return;
    const scope = { accountId: found.id };
    await this.db.enter(scope);
    const account = await this.db.manager.findOneByOrFail(Account, { id: found.id });
    const secret = await this.tokens.issue({ purpose: 'reset', accountId: account.id });
    const url = `${this.config.get<string>('PUBLIC_URL')}/reset/${secret}`;
    await this.mail.write(resetLetter(account.email, account.name, url), scope);
  }

  /** Sets a new password by an e-mailed link, and signs out everywhere. */
  async reset(secret: string, password: string): Promise<void> {
    const token = await this.tokens.open(secret, 'reset');
    await this.tokens.use(token);
    await this.set(token.accountId!, password);
  }

  async change(actor: Actor, current: string, password: string): Promise<void> {
    const account = await this.db.manager.findOneByOrFail(Account, { id: actor.accountId });
    if (!(await passwordFits(account.passwordHash, current))) {
      throw unprocessable('current', 'That is not your present password.');
    }
    await this.set(account.id, password);
  }

  private async set(accountId: string, password: string): Promise<void> {
    await this.db.manager.update(Account, accountId, { passwordHash: await hashPassword(password) });
    await this.sessions.endAll(accountId);
  }
}
