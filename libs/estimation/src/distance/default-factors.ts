import type { Factors } from '../types';

/** How many km on a clean dry road one km counts for. Common practice, no source; every workshop may change them. */
export const defaultFactors: Factors = {
  surface: {
    road: { lube: 1, wear: 1 },
    gravel: { lube: 1.5, wear: 1.5 },
    mountain: { lube: 2.5, wear: 2.5 },
    indoor: { lube: 1, wear: 0.8 },
  },
  weather: {
    dry: { lube: 1, wear: 1 },
    damp: { lube: 1.3, wear: 1.3 },
    wet: { lube: 2, wear: 2 },
    mud: { lube: 3, wear: 4 },
  },
  // Share of rides in the wet in a temperate climate: common practice, no source.
  wetShareByMonth: [0.3, 0.28, 0.26, 0.22, 0.2, 0.17, 0.14, 0.15, 0.18, 0.24, 0.3, 0.32],
};
