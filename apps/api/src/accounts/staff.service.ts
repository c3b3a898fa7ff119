import { Injectable } from '@nestjs/common';
import type { Page, PageQuery, StaffMember } from '@halfpitch/contracts';
import type { Actor } from '../common/actor';
import { pageOf } from '../common/paging';
import { forbidden, notFound } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { Member } from './member.entity';

export function toStaffMember({ id, name, email, role, accountId }: Member): StaffMember {
  return { id, name, email, role, joined: accountId !== null };
}

@Injectable()
export class StaffService {
  constructor(private readonly db: TenantDb) {}

  list(query: PageQuery): Promise<Page<StaffMember>> {
    const members = this.db.manager
      .createQueryBuilder(Member, 'member')
      .where(`member.role <> 'rider'`)
      .orderBy('member.name');
    return pageOf(members, query, toStaffMember);
  }

  async remove(actor: Actor, memberId: string): Promise<void> {
    if (memberId === actor.memberId) throw forbidden('You cannot remove yourself; another owner can.');
    const member = await this.db.manager.findOneBy(Member, { id: memberId });
    if (!member || member.role === 'rider') throw notFound('member of staff');
    await this.db.manager.delete(Member, memberId);
  }
}
