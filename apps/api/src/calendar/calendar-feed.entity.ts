import { Column, Entity, PrimaryColumn } from 'typeorm';

/** The secret calendar address of a person in a workshop; the secret itself is not kept. */
@Entity('calendar_feed')
export class CalendarFeed {
  @PrimaryColumn('uuid')
  accountId: string;

  @PrimaryColumn('uuid')
  workshopId: string;

  @Column('text')
  tokenHash: string;

  @Column('timestamptz')
  madeAt: Date;
}
