import { Injectable } from '@nestjs/common';
import { IsNull, MoreThan } from 'typeorm';
import { Clock } from '../common/clock';
import { ProblemException } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { AccountToken } from './account-token.entity';
import { Directory } from './directory';
import { hashToken, newToken } from './secrets';

const HOURS = { reset: 1, invitation: 7 * 24 };

/** Links that work once, for a while, and are kept hashed. */
@Injectable()
export class TokensService {
  constructor(
    private readonly db: TenantDb,
    private readonly directory: Directory,
    private readonly clock: Clock,
  ) {}

  /** Makes a link's secret; earlier links of the same purpose and person stop working. */
  async issue(
    token: Pick<AccountToken, 'purpose'> &
      Partial<Pick<AccountToken, 'accountId' | 'workshopId' | 'memberId'>>,
  ): Promise<string> {
    const secret = newToken();
    const whose = token.memberId ? { memberId: token.memberId } : { accountId: token.accountId ?? undefined };
    await this.db.manager.delete(AccountToken, { purpose: token.purpose, ...whose });
    const expiresAt = new Date(this.clock.now().getTime() + HOURS[token.purpose] * 3_600_000);
    await this.db.manager.insert(
      AccountToken,
      Object.assign(new AccountToken(), token, { tokenHash: hashToken(secret), expiresAt }),
    );
    return secret;
  }

  /** Enters the scope that a link opens, and checks that it still works. @throws 410 otherwise. */
  async open(secret: string, purpose: AccountToken['purpose']): Promise<AccountToken> {
    const found = await this.directory.token(secret);
    if (found?.purpose === purpose) {
      await this.db.enter({
        workshopId: found.workshop_id ?? undefined,
        accountId: found.account_id ?? undefined,
      });
      const token = await this.db.manager.findOneBy(AccountToken, {
        id: found.id,
        usedAt: IsNull(),
        expiresAt: MoreThan(this.clock.now()),
      });
      if (token) return token;
    }
    throw new ProblemException(
      410,
      'This link no longer works',
      'It was used already or is too old. Ask for a new one.',
    );
  }

  /** Marks it used. @throws 410 when another request was faster. */
  async use(token: AccountToken): Promise<void> {
    const { affected } = await this.db.manager.update(
      AccountToken,
      { id: token.id, usedAt: IsNull() },
      { usedAt: this.clock.now() },
    );
    if (affected !== 1)
      throw new ProblemException(410, 'This link no longer works', 'It was used already. Ask for a new one.');
  }
}
