import type { ArrivalCondition, TreatmentKind } from '@halfpitch/contracts';
import { Column, Entity } from 'typeorm';
import { TenantEntity } from '../database/tenant-entity';

/** What was done to a chain, and how the treatment before it was found. */
@Entity('treatment')
export class Treatment extends TenantEntity {
  @Column('uuid')
  chainId: string;

  @Column('date')
  day: string;

  @Column('text')
  kind: TreatmentKind;

  @Column('text')
  arrival: ArrivalCondition;

  @Column('text')
  notes: string = '';

  @Column('text')
  byName: string;
}
