import { Injectable } from '@nestjs/common';
import type { registerWorkshop } from '@halfpitch/contracts';
import type { z } from 'zod';
import { ProblemException } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { defaultSettings } from '../workshop/default-settings';
import { Workshop } from '../workshop/workshop.entity';
import { Account } from './account.entity';
import { SessionUser } from './actors.service';
import { Directory } from './directory';
import { Member } from './member.entity';
import { hashPassword, passwordFits } from './secrets';

type Registration = z.infer<typeof registerWorkshop>;

@Injectable()
export class RegistrationService {
  constructor(
    private readonly db: TenantDb,
    private readonly directory: Directory,
  ) {}

  /** Opens a workshop with its owner; somebody who has an account already proves it with its password. */
  async register(input: Registration): Promise<SessionUser> {
    const { manager } = this.db;
    const present = await this.directory.accountForEmail(input.email);
    if (present && !(await passwordFits(present.password_hash, input.password))) {
      throw new ProblemException(
        409,
        'Already there',
        'This address could not be registered with that password. If it is yours, sign in or ask for a new password.',
      );
    }
    const { name, email } = input;
    const account = Object.assign(new Account(), {
      name,
      email,
      passwordHash: await hashPassword(input.password),
    });
    if (present) account.id = present.id;
    const workshop = Object.assign(new Workshop(), {
      name: input.workshopName,
      town: input.town,
      timeZone: input.timeZone,
      settings: defaultSettings(),
    });
    const ids = { workshopId: workshop.id, accountId: account.id };
    await this.db.enter(ids);
    await manager.save(Workshop, workshop);
    if (!present) await manager.insert(Account, account);
    await manager.insert(Member, Object.assign(new Member(), { ...ids, role: 'owner', name, email }));
    return ids;
  }
}
