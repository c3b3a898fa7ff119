import { Injectable, NestMiddleware } from '@nestjs/common';
import type { NextFunction, Request, Response } from 'express';
import type { Actor } from '../common/actor';
import { bearerOf } from '../common/bearer';
import { Clock } from '../common/clock';
import { ProblemException } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { ActorsService } from './actors.service';
import { ApiToken } from './api-token.entity';
import { Directory } from './directory';
import { Throttle } from './throttle';

const A_MINUTE_MS = 60_000;

/** Makes a call with `Authorization: Bearer` that of the token's person, whatever session the call carries too. */
@Injectable()
export class BearerMiddleware implements NestMiddleware {
  constructor(
    private readonly db: TenantDb,
    private readonly clock: Clock,
    private readonly directory: Directory,
    private readonly actors: ActorsService,
    private readonly throttle: Throttle,
  ) {}

  async use(request: Request, _: Response, next: NextFunction): Promise<void> {
    const secret = bearerOf(request.get('authorization'));
    if (secret === undefined) return next();
    const opened = await this.open(secret);
    if (!opened) {
      await this.throttle.countStranger(request.ip ?? '');
      throw new ProblemException(
        401,
        'Not signed in',
        'This token does not work: it was revoked, has expired or was mistyped. Make a new one under Account.',
      );
    }
    await this.throttle.countCall(opened.token.id);
    request.user = opened.actor;
    request.tokenScopes = opened.token.scopes;
    next();
  }

  private async open(secret: string): Promise<{ actor: Actor; token: ApiToken } | undefined> {
    const found = await this.db.run({}, () => this.directory.apiToken(secret));
    if (!found) return undefined;
    const user = { accountId: found.account_id, workshopId: found.workshop_id };
    const actor = await this.actors.load(user);
    if (!actor) return undefined;
    return this.db.run(user, async () => {
      const token = await this.db.manager.findOneBy(ApiToken, { id: found.id });
      if (!token || (token.lastDay !== null && token.lastDay < this.clock.today(actor.timeZone)))
        return undefined;
      await this.noteUse(token);
      return { actor, token };
    });
  }

  /** Notes when it was last used, to the minute: not a write a call. */
  private async noteUse(token: ApiToken): Promise<void> {
    const now = this.clock.now();
    if (token.lastUsedAt && now.getTime() - token.lastUsedAt.getTime() < A_MINUTE_MS) return;
    await this.db.manager.update(ApiToken, token.id, { lastUsedAt: now });
  }
}
