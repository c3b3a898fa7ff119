import type { DistanceUnit } from '@halfpitch/contracts';
import { Column, Entity } from 'typeorm';
import { TenantEntity } from '../database/tenant-entity';

/** A customer of the workshop, with or without an account. */
@Entity('rider')
export class Rider extends TenantEntity {
  @Column('text')
  name: string;

  @Column('text')
  email: string;

  @Column('text')
  phone: string = '';

  @Column('text')
  notes: string = '';

  @Column('text')
  distanceUnit: DistanceUnit = 'km';

  @Column('boolean')
  remindersOn: boolean = true;

  /** Secret part of the link that stops the e-mails. */
  @Column('text')
  stopToken: string;
}
