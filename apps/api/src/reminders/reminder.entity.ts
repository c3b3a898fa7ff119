import type { Reminder as WireReminder } from '@halfpitch/contracts';
import { Column, Entity } from 'typeorm';
import { TenantEntity } from '../database/tenant-entity';

/** At most one per chain, kind and cycle (the treatment whose life runs out, or the chain's own life). */
@Entity('reminder')
export class Reminder extends TenantEntity {
  @Column('uuid')
  chainId: string;

  @Column('uuid')
  riderId: string;

  @Column('text')
  kind: WireReminder['kind'];

  @Column('text')
  cycle: string;

  @Column('uuid', { nullable: true })
  mailId: string | null = null;

  @Column('boolean')
  held: boolean = false;

  @Column('timestamptz', { nullable: true })
  closedAt: Date | null = null;

  @Column('date', { nullable: true })
  p10: string | null = null;

  @Column('date', { nullable: true })
  p50: string | null = null;

  @Column('date', { nullable: true })
  p90: string | null = null;

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;
}
