import type { Role } from '@halfpitch/contracts';
import { Column, Entity } from 'typeorm';
import { TenantEntity } from '../database/tenant-entity';

/** A person's one role in one workshop; without an account while the invitation is open. */
@Entity('member')
export class Member extends TenantEntity {
  @Column('uuid', { nullable: true })
  accountId: string | null = null;

  @Column('text')
  role: Role;

  @Column('uuid', { nullable: true })
  riderId: string | null = null;

  @Column('text')
  name: string;

  @Column('text')
  email: string;
}
