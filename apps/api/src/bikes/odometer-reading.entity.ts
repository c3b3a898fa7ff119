import { Column, Entity } from 'typeorm';
import { TenantEntity } from '../database/tenant-entity';

/** What the bike's odometer showed: kilometres the log lacks between two of these are unlogged distance. */
@Entity('odometer_reading')
export class OdometerReading extends TenantEntity {
  @Column('uuid')
  bikeId: string;

  @Column('date')
  day: string;

  @Column('integer')
  odometerM: number;
}
