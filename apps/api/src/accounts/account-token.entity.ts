import { Column, Entity, PrimaryColumn } from 'typeorm';
import { v7 } from 'uuid';

/** A link that was e-mailed: kept hashed, used once, expiring. */
@Entity('account_token')
export class AccountToken {
  @PrimaryColumn('uuid')
  id: string = v7();

  @Column('text')
  purpose: 'reset' | 'invitation';

  @Column('text')
  tokenHash: string;

  @Column('uuid', { nullable: true })
  accountId: string | null = null;

  @Column('uuid', { nullable: true })
  workshopId: string | null = null;

  @Column('uuid', { nullable: true })
  memberId: string | null = null;

  @Column('timestamptz')
  expiresAt: Date;

  @Column('timestamptz', { nullable: true })
  usedAt: Date | null = null;
}
