import { MethodError, methodErrors } from './methods';
import { RUN_IN, RunInPrior } from './priors';
import { WRONG_SHARE } from './reading-likelihood';
import type { Reading, ReadingMethod } from '../types';

/** A reading with the wear km the chain had when it was taken. */
export interface PlacedReading extends Reading {
  wearKm: number;
}

/** What is taken as known of how chains start and how readings err. */
export interface ElongationModel {
  runIn: RunInPrior;
  methods: Record<ReadingMethod, MethodError>;
  wrongShare: number;
}

export const defaultElongationModel: ElongationModel = {
  runIn: RUN_IN,
  methods: methodErrors,
  wrongShare: WRONG_SHARE,
};

/** Readings that share one offset: those of one gauge on one chain, or of one method where no gauge was named. */
export function byGauge(readings: readonly PlacedReading[]): PlacedReading[][] {
  const groups = new Map<string, PlacedReading[]>();
  for (const reading of readings) {
    const key = `${reading.method}/${reading.gauge ?? ''}`;
    const group = groups.get(key);
    if (group) group.push(reading);
    else groups.set(key, [reading]);
  }
  return [...groups.values()];
}
