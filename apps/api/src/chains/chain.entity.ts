import type { Regime, RetiredReason } from '@halfpitch/contracts';
import { Column, Entity } from 'typeorm';
import { TenantEntity } from '../database/tenant-entity';

/** Belongs to a rider; on one bike at a time, or in the box. */
@Entity('chain')
export class Chain extends TenantEntity {
  @Column('uuid')
  riderId: string;

  @Column('text')
  label: string;

  @Column('smallint')
  speeds: number;

  @Column('text')
  regime: Regime;

  /** % elongation at which it must be replaced; null = by speeds. */
  @Column('real', { nullable: true })
  wearLimitPct: number | null = null;

  @Column('date')
  inServiceOn: string;

  @Column('date', { nullable: true })
  retiredOn: string | null = null;

  @Column('text', { nullable: true })
  retiredBecause: RetiredReason | null = null;
}
