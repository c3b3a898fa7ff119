import type { Ride as WireRide, Surface, Weather } from '@halfpitch/contracts';
import { Column, Entity } from 'typeorm';
import { TenantEntity } from '../database/tenant-entity';

@Entity('ride')
export class Ride extends TenantEntity {
  @Column('uuid')
  bikeId: string;

  /** The chain that was on the bike that day. */
  @Column('uuid', { nullable: true })
  chainId: string | null = null;

  @Column('date')
  day: string;

  @Column('timestamptz', { nullable: true })
  startedAt: Date | null = null;

  @Column('integer')
  distanceM: number;

  @Column('integer', { nullable: true })
  movingS: number | null = null;

  @Column('text')
  surface: Surface;

  @Column('text')
  weather: Weather;

  @Column('text')
  notes: string = '';

  @Column('text')
  source: WireRide['source'];

  /** The same ride always has the same; unique per bike, so that nothing is counted twice. */
  @Column('text')
  fingerprint: string;
}
