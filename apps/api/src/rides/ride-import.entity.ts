import type { RideImport as WireImport, Surface, Weather } from '@halfpitch/contracts';
import type { CsvMatching } from '@halfpitch/ride-files';
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

  @Column('text')
  otherSports: 'leave' | 'take' = 'leave';

  /** How the columns of a CSV are to be read, where the rider was asked. */
  @Column('jsonb', { nullable: true })
  matching: CsvMatching | null = null;

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

  /** Of those refused, recordings of another sport. */
  @Column('integer')
  otherSport: number = 0;

  @Column('jsonb')
  problems: WireImport['problems'] = [];

  @Column('text')
  message: string = '';

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;
}
