import { RideImport as WireImport, Surface, Weather } from '@halfpitch/contracts';
import { Column, Entity } from 'typeorm';
import { TenantEntity } from '../database/tenant-entity';

/** A file on its way in; the file itself is dropped when done. */
@Entity('ride_import')
export class RideImport extends TenantEntity {
  @Column('uuid')
  riderId: string;

  @Column('uuid')
  bikeId: string;

  @Column('text')
  fileName: string;

  @Column('text')
  surface: Surface;

  @Column('text')
  weather: Weather;

  @Column('bytea', { nullable: true, select: false })
  file: Buffer | null = null;

  @Column('text')
  state: WireImport['state'] = 'waiting';

  @Column('integer')
  total: number = 0;

  @Column('integer')
  added: number = 0;

  @Column('integer')
  alreadyThere: number = 0;

  @Column('integer')
  refused: number = 0;

  @Column('jsonb')
  problems: WireImport['problems'] = [];

  @Column('text')
  message: string = '';
}
