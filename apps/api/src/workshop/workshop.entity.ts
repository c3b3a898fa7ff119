import type { WorkshopSettings } from '@halfpitch/contracts';
import type { FleetModel } from '@halfpitch/estimation';
import { Column, Entity, PrimaryColumn } from 'typeorm';
import { v7 } from 'uuid';

/** What of the settings is kept as one document: all but the columns of their own. */
export type StoredSettings = Pick<
  WorkshopSettings,
  'factors' | 'calendarLimitDays' | 'reminderPolicy' | 'bench'
>;

/** A tenant. */
@Entity('workshop')
export class Workshop {
  @PrimaryColumn('uuid')
  id: string = v7();

  @Column('text')
  name: string;

  @Column('text')
  town: string;

  @Column('text')
  timeZone: string;

  @Column('char', { length: 3 })
  currency: string = 'EUR';

  @Column('jsonb')
  settings: StoredSettings;

  /** What the workshop's own riders and chains have taught; null until first fitted. */
  @Column('jsonb', { nullable: true })
  fleetModel: FleetModel | null = null;

  /** The day of the last nightly estimate. */
  @Column('date', { nullable: true })
  estimatedOn: string | null = null;
}
