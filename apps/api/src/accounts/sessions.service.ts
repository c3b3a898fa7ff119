import { Injectable } from '@nestjs/common';
import type { Request } from 'express';
import { promisify } from 'node:util';
import type { Actor } from '../common/actor';
import { forbidden } from '../common/problems';
import { SessionPool } from '../database/session-pool';
import { TenantDb } from '../database/tenant-db';
import { ActorsService } from './actors.service';
import { Member } from './member.entity';

@Injectable()
export class SessionsService {
  constructor(
    private readonly db: TenantDb,
    private readonly actors: ActorsService,
    private readonly sessions: SessionPool,
  ) {}

  /** Makes the request's browser that of `actor`, under a new session id. */
  async begin(request: Request, actor: Actor): Promise<void> {
    await promisify<Actor, void>((user, done) => request.logIn(user, done))(actor);
  }

  async end(request: Request): Promise<void> {
    await promisify<void>((done) => request.logout(done))();
  }

  /** Ends every session of an account, on all devices, at once. */
  async endAll(accountId: string): Promise<void> {
    await this.sessions.pool.query(
      `delete from session where sess -> 'passport' -> 'user' ->> 'accountId' = $1`,
      [accountId],
    );
  }

  async chooseWorkshop(request: Request, actor: Actor, workshopId: string): Promise<Actor> {
    const member = await this.db.manager.findOneBy(Member, { accountId: actor.accountId, workshopId });
    const next = member && (await this.actors.load({ accountId: actor.accountId, workshopId }));
    if (!next) throw forbidden('You do not belong to that workshop.');
    await this.db.enter(next);
    await this.begin(request, next);
    return next;
  }
}
