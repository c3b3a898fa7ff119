import type { DistanceUnit } from '@halfpitch/contracts';
import { Column, Entity, PrimaryColumn } from 'typeorm';
import { v7 } from 'uuid';

/** A person who can sign in, in however many workshops. */
@Entity('account')
export class Account {
  @PrimaryColumn('uuid')
  id: string = v7();

  @Column('text')
  name: string;

  @Column('text')
  email: string;

  @Column('text')
  passwordHash: string;

  @Column('text')
  distanceUnit: DistanceUnit = 'km';
}
