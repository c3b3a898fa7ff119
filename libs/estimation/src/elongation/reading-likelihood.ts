import { normalCdf, normalPdf } from '../math/normal';
import type { Reading } from '../types';
import { methodErrors } from './methods';

/** Share of readings that are simply wrong (a tool that slipped, a line mixed up), and how widely those scatter, %. */
export const WRONG_SHARE = 0.03;
const WRONG_SD = 0.3;

/** Density of the largest of n equal places with normal noise, at z standard deviations above the truth. */
function worstOf(n: number, z: number): number {
  return n === 1 ? normalPdf(z) : n * normalPdf(z) * normalCdf(z) ** (n - 1);
}

/** Likelihood of a reading, given what the gauge would show without noise (true elongation + offset, %). */
export function soundLikelihood(reading: Reading, shown: number): number {
  const { noiseSd } = methodErrors[reading.method];
  if (reading.values)
    return worstOf(reading.values.length, (Math.max(...reading.values) - shown) / noiseSd) / noiseSd;
  const below = reading.upper === undefined ? 1 : normalCdf((reading.upper - shown) / noiseSd);
  const notYet = reading.lower === undefined ? 0 : normalCdf((reading.lower - shown) / noiseSd);
  return Math.max(below - notYet, 0);
}

/** Likelihood of a reading that is wrong: it says next to nothing about the chain. */
export function wrongLikelihood(reading: Reading, shown: number): number {
  if (!reading.values) return 0.5;
  return normalPdf((Math.max(...reading.values) - shown) / WRONG_SD) / WRONG_SD;
}

/** Robust likelihood: sound with a small chance of being wrong. */
export function readingLikelihood(reading: Reading, shown: number): number {
  return (1 - WRONG_SHARE) * soundLikelihood(reading, shown) + WRONG_SHARE * wrongLikelihood(reading, shown);
}
