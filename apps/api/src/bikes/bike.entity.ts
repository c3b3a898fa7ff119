import type { BikeKind, BrakeFluid } from '@halfpitch/contracts';
import { Column, Entity } from 'typeorm';
import { TenantEntity } from '../database/tenant-entity';

@Entity('bike')
export class Bike extends TenantEntity {
  @Column('uuid')
  riderId: string;

  @Column('text')
  name: string;

  @Column('text')
  kind: BikeKind;

  @Column('smallint')
  speeds: number;

  @Column('text')
  brakeFluid: BrakeFluid;

  @Column('text')
  notes: string = '';
}
