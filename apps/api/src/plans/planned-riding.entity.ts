import { Column, CreateDateColumn, Entity } from 'typeorm';
import { TenantEntity } from '../database/tenant-entity';

/** Riding on a bike beside the usual, on days to come. */
@Entity('planned_riding')
export class PlannedRiding extends TenantEntity {
  @Column('uuid')
  bikeId: string;

  @Column('text')
  name: string;

  @Column('date')
  fromDay: string;

  @Column('date')
  toDay: string;

  @Column('integer')
  distanceM: number;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;
}
