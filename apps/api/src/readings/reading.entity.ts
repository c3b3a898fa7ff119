import type { ReadingMethod } from '@halfpitch/contracts';
import { Column, Entity } from 'typeorm';
import { TenantEntity } from '../database/tenant-entity';

/** One taking of a chain checker: figures at one to five places, or what goes in and what does not (%). */
@Entity('reading')
export class Reading extends TenantEntity {
  @Column('uuid')
  chainId: string;

  @Column('date')
  day: string;

  @Column('text')
  method: ReadingMethod;

  @Column('real', { array: true, nullable: true })
  valuesPct: number[] | null = null;

  @Column('real', { nullable: true })
  lowerPct: number | null = null;

  @Column('real', { nullable: true })
  upperPct: number | null = null;

  @Column('boolean')
  baseline: boolean = false;

  @Column('text')
  notes: string = '';

  @Column('text')
  byName: string;

  @Column('uuid', { nullable: true })
  byAccountId: string | null = null;
}
