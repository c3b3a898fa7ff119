import type { ChainEstimate } from '@halfpitch/contracts';
import { Column, Entity } from 'typeorm';
import { TenantEntity } from '../database/tenant-entity';

/** What of an estimate is kept as one document; the rest are columns of their own or derived. */
export type EstimateDetail = Omit<ChainEstimate, 'id' | 'chainId' | 'madeAt'> & {
  /** Chance of falling due in week w from the day it was made, w = 0..25: what the workload is summed from; of a treatment given then, `renewal`. */
  weekly: { lubrication: number[] | null; replacement: number[]; renewal?: number[] };
};

/** The last estimate of each day is kept, so that what was said can be held against what happened. */
@Entity('estimate')
export class Estimate extends TenantEntity {
  @Column('uuid')
  chainId: string;

  @Column('date')
  madeOn: string;

  @Column('timestamptz')
  madeAt: Date;

  @Column('text')
  modelVersion: string;

  @Column('real')
  shareUsed: number;

  @Column('date', { nullable: true })
  lubricationP50: string | null = null;

  @Column('date', { nullable: true })
  replacementP50: string | null = null;

  @Column('jsonb')
  detail: EstimateDetail;
}
