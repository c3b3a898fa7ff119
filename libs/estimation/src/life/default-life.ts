import type { LifeModel } from '../types';

/** Median lube km a treatment lasts. Common practice; maker's ranges read: immersion wax 160 to 500, oil at most 250. */
export const defaultLife: LifeModel = {
  kinds: {
    'strip-wax': { median: 350, observations: 0 },
    're-wax': { median: 300, observations: 0 },
    'drip-top-up': { median: 180, observations: 0 },
    'oil-wet': { median: 200, observations: 0 },
    'oil-dry': { median: 150, observations: 0 },
  },
  logSdWithin: 0.35,
  logSdBetween: 0.25,
};
