import type { ReadingMethod } from '../types';

export interface MethodError {
  /** Mean of a gauge's offset, %: roller play that a two-point gauge adds. */
  offset: number;
  offsetSd: number;
  noiseSd: number;
}

/** How each method errs, % elongation. Our judgement from published comparisons (Zinn in Velo; Rohloff; see README). */
export const methodErrors: Record<ReadingMethod, MethodError> = {
  'steel-rule': { offset: 0, offsetSd: 0.02, noiseSd: 0.06 },
  'three-point': { offset: 0, offsetSd: 0.03, noiseSd: 0.04 },
  'two-point': { offset: 0.12, offsetSd: 0.08, noiseSd: 0.05 },
  digital: { offset: 0, offsetSd: 0.02, noiseSd: 0.02 },
  'drop-in': { offset: 0.12, offsetSd: 0.08, noiseSd: 0.05 },
};
