import type { RidingModel } from '../types';

/** Forecasts look two years ahead. */
export const HORIZON_DAYS = 731;

export interface BlockModel extends RidingModel {
  /** Weight of a block halves with every so many days of age. */
  halfLifeDays: number;
  /** How much more a block of the same season weighs. */
  seasonFavour: number;
  /** Km a week of riders in general: what a short log is mixed with. Log-normal. */
  fleetWeekKm: { median: number; logSd: number };
  /** How many blocks of 28 days the fleet counts for. */
  fleetBlocks: number;
}

export const defaultRidingModel: BlockModel = {
  version: 'blocks-1',
  halfLifeDays: 60,
  seasonFavour: 3,
  fleetWeekKm: { median: 50, logSd: 0.9 },
  fleetBlocks: 1,
};
