import { Injectable } from '@nestjs/common';
import type { ApiToken as TokenView, MadeApiToken, NewApiToken, Page, PageQuery } from '@halfpitch/contracts';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { pageOf } from '../common/paging';
import { conflict, notFound, unprocessable } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { Workshop } from '../workshop/workshop.entity';
import { ApiToken } from './api-token.entity';
import { hashToken, newToken } from './secrets';

const MOST = 20;

/** A person's own tokens for scripts: made, listed, revoked. */
@Injectable()
export class ApiTokensService {
  constructor(
    private readonly db: TenantDb,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor, query: PageQuery): Promise<Page<TokenView>> {
    const tokens = this.db.manager.createQueryBuilder(ApiToken, 'token').orderBy('token.createdAt', 'DESC');
    const names = new Map((await this.db.manager.find(Workshop)).map(({ id, name }) => [id, name]));
    return pageOf(tokens, query, (token) => this.view(actor, token, names.get(token.workshopId) ?? ''));
  }

  /** The secret is answered here and never again. @throws 409 with too many tokens, 422 with a day gone by. */
  async make(actor: Actor, { name, scopes, lastDay }: NewApiToken): Promise<MadeApiToken> {
    if (lastDay !== null && lastDay < this.clock.today(actor.timeZone))
      throw unprocessable('lastDay', 'Choose a last day that is still to come, or none.');
    if ((await this.db.manager.count(ApiToken)) >= MOST)
      throw conflict(`You have ${MOST} tokens already. Revoke one that you no longer use first.`);
    const secret = `halfpitch_${newToken()}`;
    const { accountId, workshopId } = actor;
    const token = await this.db.manager.save(
      Object.assign(new ApiToken(), {
        accountId,
        workshopId,
        name,
        scopes,
        lastDay,
        tokenHash: hashToken(secret),
      }),
    );
    const workshop = await this.db.manager.findOneByOrFail(Workshop, { id: workshopId });
    return { token: this.view(actor, token, workshop.name), secret };
  }

  async revoke(tokenId: string): Promise<void> {
    const { affected } = await this.db.manager.delete(ApiToken, { id: tokenId });
    if (affected !== 1) throw notFound('token');
  }

  private view(actor: Actor, token: ApiToken, workshopName: string): TokenView {
    const { id, name, scopes, lastDay, createdAt, lastUsedAt } = token;
    return {
      id,
      name,
      scopes,
      workshopName,
      lastDay,
      createdAt: createdAt.toISOString(),
      lastUsedAt: lastUsedAt?.toISOString() ?? null,
      expired: lastDay !== null && lastDay < this.clock.today(actor.timeZone),
    };
  }
}
