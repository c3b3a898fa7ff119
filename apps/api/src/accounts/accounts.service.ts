import { Injectable } from '@nestjs/common';
import type {
  acceptInvitation,
  accountChange,
  changePassword,
  Done,
  InvitationView,
  registerWorkshop,
  resetPassword,
} from '@halfpitch/contracts';
import type { Request } from 'express';
import type { z } from 'zod';
import type { Actor } from '../common/actor';
import { TenantDb } from '../database/tenant-db';
import { Account } from './account.entity';
import { ActorsService, SessionUser } from './actors.service';
import { InvitationsService } from './invitations.service';
import { PasswordsService } from './passwords.service';
import { RegistrationService } from './registration.service';
import { SessionsService } from './sessions.service';
import { Throttle } from './throttle';

const DONE: Done = { done: true };

/** What people do with their accounts, each counted against too many tries and ending signed in where it should. */
@Injectable()
export class AccountsService {
  constructor(
    private readonly db: TenantDb,
    private readonly actors: ActorsService,
    private readonly registration: RegistrationService,
    private readonly invitations: InvitationsService,
    private readonly passwords: PasswordsService,
    private readonly sessions: SessionsService,
    private readonly throttle: Throttle,
  ) {}

  async register(request: Request, input: z.infer<typeof registerWorkshop>): Promise<Done> {
    await this.throttle.count(request.ip ?? '', input.email);
    const user = await this.registration.register(input);
    await this.throttle.forget(input.email);
    return this.signIn(request, user);
  }

  invitation(token: string): Promise<InvitationView> {
    return this.invitations.view(token);
  }

  async accept(
    request: Request,
    token: string,
    { name, password }: z.infer<typeof acceptInvitation>,
  ): Promise<Done> {
    await this.throttle.count(request.ip ?? '', token);
    return this.signIn(request, await this.invitations.accept(token, name, password));
  }

  async forgotten(request: Request, email: string): Promise<Done> {
    await this.throttle.count(request.ip ?? '', email);
    await this.passwords.forgotten(email);
    return DONE;
  }

  async reset(request: Request, { token, password }: z.infer<typeof resetPassword>): Promise<Done> {
    await this.throttle.count(request.ip ?? '', token);
    await this.passwords.reset(token, password);
    return DONE;
  }

  /** Changing the password ends all sessions but this one, which goes on under a new id. */
  async changePassword(request: Request, actor: Actor, input: z.infer<typeof changePassword>): Promise<Done> {
    await this.throttle.count(request.ip ?? '', actor.email);
    await this.passwords.change(actor, input.current, input.password);
    await this.throttle.forget(actor.email);
    return this.signIn(request, actor);
  }

  async change(actor: Actor, { name, distanceUnit }: z.infer<typeof accountChange>): Promise<Done> {
    await this.db.manager.update(Account, actor.accountId, { name, distanceUnit });
    return DONE;
  }

  private async signIn(request: Request, user: SessionUser): Promise<Done> {
    const actor = await this.actors.load(user);
    if (actor) await this.sessions.begin(request, actor);
    return DONE;
  }
}
