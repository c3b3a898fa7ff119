import { Injectable } from '@nestjs/common';
import { ConfigService } from '@nestjs/config';
import type { InvitationView, Role } from '@halfpitch/contracts';
import { conflict, unprocessable } from '../common/problems';
import { Environment } from '../config/environment';
import { TenantDb } from '../database/tenant-db';
import { MailService } from '../mail/mail.service';
import { Workshop } from '../workshop/workshop.entity';
import { Account } from './account.entity';
import { SessionUser } from './actors.service';
import { Directory } from './directory';
import { invitationLetter } from './letters';
import { Member } from './member.entity';
import { hashPassword, passwordFits } from './secrets';
import { TokensService } from './tokens.service';

export interface Invitation {
  workshopId: string;
  name: string;
  email: string;
  role: Role;
  riderId?: string;
}

@Injectable()
export class InvitationsService {
  constructor(
    private readonly db: TenantDb,
    private readonly directory: Directory,
    private readonly tokens: TokensService,
    private readonly mail: MailService,
    private readonly config: ConfigService<Environment, true>,
  ) {}

  /** Writes an invitation; asked again, it writes a new one and the old link stops working. */
  async invite({ workshopId, name, email, role, riderId }: Invitation): Promise<Member> {
    const { manager } = this.db;
    const present = await manager.findOneBy(Member, { workshopId, email });
    if (present?.accountId) throw conflict(`${email} already belongs to this workshop.`);
    const member = Object.assign(present ?? new Member(), {
      workshopId,
      name,
      email,
      role,
      riderId: riderId ?? null,
    });
    await manager.save(Member, member);
    const secret = await this.tokens.issue({ purpose: 'invitation', workshopId, memberId: member.id });
    const workshop = await manager.findOneByOrFail(Workshop, { id: workshopId });
    const url = `${this.config.get<string>('PUBLIC_URL')}/invitation/${secret}`;
    await this.mail.write(invitationLetter(email, name, workshop.name, url), { workshopId });
    return member;
  }

  async view(secret: string): Promise<InvitationView> {
    const { workshop, member, account } = await this.read(secret);
    const { name, email, role } = member;
    return { workshopName: workshop.name, name, email, role, hasAccount: account !== undefined };
  }

  /** Joins the workshop: with a new account, or with the present one and its password. */
  async accept(secret: string, name: string, password: string): Promise<SessionUser> {
    const { token, member, account } = await this.read(secret);
    if (account && !(await passwordFits(account.password_hash, password))) {
      throw unprocessable('password', 'This address already has an account, and that is not its password.');
    }
    await this.tokens.use(token);
    const accountId = account?.id ?? (await this.open(member, name, password));
    await this.db.manager.update(Member, member.id, { accountId });
    return { accountId, workshopId: member.workshopId };
  }

  private async read(secret: string) {
    const token = await this.tokens.open(secret, 'invitation');
    const member = await this.db.manager.findOneByOrFail(Member, { id: token.memberId! });
    const workshop = await this.db.manager.findOneByOrFail(Workshop, { id: member.workshopId });
    return { token, member, workshop, account: await this.directory.accountForEmail(member.email) };
  }

  private async open(member: Member, name: string, password: string): Promise<string> {
    const account = Object.assign(new Account(), {
      name,
      email: member.email,
      passwordHash: await hashPassword(password),
    });
    await this.db.enter({ workshopId: member.workshopId, accountId: account.id });
    await this.db.manager.insert(Account, account);
    return account.id;
  }
}
