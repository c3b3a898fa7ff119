import type { ReadingMethod } from '@halfpitch/contracts';
import type { Bike } from '../bikes/bike.entity';
import type { OdometerReading } from '../bikes/odometer-reading.entity';
import type { Chain } from '../chains/chain.entity';
import type { Fitting } from '../chains/fitting.entity';
import type { Reading } from '../readings/reading.entity';
import type { Rider } from '../riders/rider.entity';
import type { Ride } from '../rides/ride.entity';
import type { Treatment } from '../treatments/treatment.entity';

/** What nobody at the workshop can see: what a chain is truly like. */
export interface ChainTruth {
  chainId: string;
  /** % per 1,000 wear km. */
  ratePct: number;
  /** True elongation now, %. */
  elongationPct: number;
  totalKm: number;
  wearKm: number;
}

/** What a gauge should have shown at that moment, %, and what this gauge adds on this chain, %. */
export interface ReadingTruth {
  readingId: string;
  method: ReadingMethod;
  elongationPct: number;
  offsetPct: number;
  /** Made up to contradict the others. */
  contradictory: boolean;
}

/** One rider with everything that belongs to them, as rows of the tables, and the truth behind them. */
export interface Household {
  /** The rider's place in the workshop's list. */
  index: number;
  rider: Rider;
  bikes: Bike[];
  chains: Chain[];
  fittings: Fitting[];
  odometer: OdometerReading[];
  rides: Ride[];
  readings: Reading[];
  treatments: Treatment[];
  truth: { chains: ChainTruth[]; readings: ReadingTruth[] };
}
