import { Injectable } from '@nestjs/common';
import type { Session } from '@halfpitch/contracts';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { ProblemException } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { Workshop } from '../workshop/workshop.entity';
import { Account } from './account.entity';
import { Member } from './member.entity';

/** What the session keeps of a person. */
export interface SessionUser {
  accountId: string;
  workshopId: string;
}

/** Turns what a session keeps into who is asking, afresh at each request, so that a changed role counts at once. */
@Injectable()
export class ActorsService {
  constructor(
    private readonly db: TenantDb,
    private readonly clock: Clock,
  ) {}

  load({ accountId, workshopId }: SessionUser): Promise<Actor | undefined> {
    return this.db.run({ accountId, workshopId }, async () => {
      const { manager } = this.db;
      const account = await manager.findOneBy(Account, { id: accountId });
      const member = await manager.findOneBy(Member, { accountId, workshopId });
      const workshop = await manager.findOneBy(Workshop, { id: workshopId });
      if (!account || !member || !workshop) return undefined;
      return {
        accountId,
        workshopId,
        memberId: member.id,
        role: member.role,
        riderId: member.riderId,
        name: account.name,
        email: account.email,
        distanceUnit: account.distanceUnit,
        timeZone: workshop.timeZone,
      };
    });
  }

  /** The workshop an account works in after signing in: the one it joined first. */
  async firstWorkshop(accountId: string): Promise<SessionUser> {
    const member = await this.db.run({ accountId }, () =>
      this.db.manager.findOne(Member, { where: { accountId }, order: { id: 'ASC' } }),
    );
    if (!member)
      throw new ProblemException(403, 'Not allowed', 'This account belongs to no workshop any more.');
    return { accountId, workshopId: member.workshopId };
  }

  /** What the web page is told of who signed in. */
  async session(actor: Actor): Promise<Session> {
    const { manager } = this.db;
    const workshop = await manager.findOneByOrFail(Workshop, { id: actor.workshopId });
    const members = await manager.findBy(Member, { accountId: actor.accountId });
    const names = new Map((await manager.find(Workshop)).map(({ id, name }) => [id, name]));
    return {
      account: { id: actor.accountId, name: actor.name, email: actor.email },
      workshop: {
        id: workshop.id,
        name: workshop.name,
        town: workshop.town,
        timeZone: workshop.timeZone,
        currency: workshop.currency,
        today: this.clock.today(workshop.timeZone),
      },
      role: actor.role,
      riderId: actor.riderId,
      preferences: { distanceUnit: actor.distanceUnit },
      workshops: members.map((m) => ({
        id: m.workshopId,
        name: names.get(m.workshopId) ?? '',
        role: m.role,
      })),
    };
  }
}
