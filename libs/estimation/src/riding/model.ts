import type { RidingModel } from '../types';

/** Forecasts look two years ahead. */
export const HORIZON_DAYS = 731;

/** Distances the model is taught at, km; between them it interpolates, beyond them it goes on in proportion. */
export const TAUGHT_KM = [150, 300, 600, 1000, 1500, 2200] as const;

/** Days after which an outcome counts as "not within the horizon" when teaching: 180 at 300 km, 540 at 1,500 km. */
export const taughtHorizon = (km: number): number =>
  Math.round(180 * (km / 300) ** (Math.log(3) / Math.log(5)));

/**
 * Quantile l of the days to reach x km: exp(location(f) + spread · exp(scale(f)) · z_l), where f are the features of the
 * log, standardised, and their products with log x.
 */
export interface Coefficients {
  mean: number[];
  sd: number[];
  location: number[];
  scale: number[];
  z: number[];
  /** Factor on the width, so that the windows hold on riders the model was not taught on. */
  spread: number;
}

/** Coefficients for logs of some months, and what stands in while a log is shorter than that. */
export interface LearnedRiding extends RidingModel, Coefficients {
  /** Riding on each day of the year relative to the mean. */
  season: number[];
  /** Taught on logs cut down to their last weeks, for riders who have just begun to log. */
  newcomer: Coefficients;
  /** For no log at all: days to reach each of TAUGHT_KM at each of LEVELS, over all riders alike. */
  blank: number[][];
  /** Riders and origins it was taught on. */
  riders: number;
  origins: number;
}
