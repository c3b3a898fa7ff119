import { Column, Entity } from 'typeorm';
import { TenantEntity } from '../database/tenant-entity';

/** A chain on a bike, from a day to a day (its last on the bike), or still. */
@Entity('fitting')
export class Fitting extends TenantEntity {
  @Column('uuid')
  chainId: string;

  @Column('uuid')
  bikeId: string;

  @Column('date')
  fromDay: string;

  @Column('date', { nullable: true })
  toDay: string | null = null;
}
