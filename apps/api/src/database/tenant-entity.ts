import { Column, PrimaryColumn } from 'typeorm';
import { v7 } from 'uuid';

/** What every row of a workshop has: an id that sorts by time, and the workshop it belongs to. */
export abstract class TenantEntity {
  @PrimaryColumn('uuid')
  id: string = v7();

  @Column('uuid')
  workshopId: string;
}
