import type { TokenScope } from '@halfpitch/contracts';
import { Column, CreateDateColumn, Entity, PrimaryColumn } from 'typeorm';
import { v7 } from 'uuid';

/** A secret with which a person's script calls in one workshop; kept hashed. */
@Entity('api_token')
export class ApiToken {
  @PrimaryColumn('uuid')
  id: string = v7();

  @Column('uuid')
  accountId: string;

  @Column('uuid')
  workshopId: string;

  @Column('text')
  name: string;

  @Column('text')
  tokenHash: string;

  @Column('text', { array: true })
  scopes: TokenScope[];

  /** The last day it works, in the workshop's time zone. */
  @Column('date', { nullable: true })
  lastDay: string | null;

  @Column('timestamptz', { nullable: true })
  lastUsedAt: Date | null = null;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;
}
