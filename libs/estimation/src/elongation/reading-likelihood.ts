import { normalCdf, normalPdf } from '../math/normal';
import type { Reading } from '../types';
import { MethodError } from './methods';

/** Share of readings that are simply wrong: a tool that slipped, a line mixed up. Our judgement. */
export const WRONG_SHARE = 0.03;
/** A wrong number is equally likely to show anything over a span of 1.5 %; a wrong go/no-go is a coin's toss. */
const WRONG_DENSITY = 1 / 1.5;
const WRONG_ANSWER = 0.5;

/** The chances that make up a robust likelihood, at one true value. */
export interface Chances {
  /** (1 - share) times the likelihood of a sound reading. */
  sound: number;
  /** share times the likelihood of a wrong one: the same whatever the chain's length. */
  wrong: number;
}

/**
 * Density of the largest of n places measured, each with the same truth and independent normal noise, at z standard
 * deviations above the truth: n φ(z) Φ(z)^(n-1). The worst place rules, so its noise is that of a maximum.
 */
function worstOf(n: number, z: number): number {
  return n === 1 ? normalPdf(z) : n * normalPdf(z) * normalCdf(z) ** (n - 1);
}

/** The reading's number, %: that of its worst place; undefined for a go/no-go answer. */
export function worstPlace({ values }: Reading): number | undefined {
  return values && values.length > 0 ? values.reduce((most, value) => Math.max(most, value)) : undefined;
}

/** Chances of a reading, given `shown` %: what its gauge would show without noise, true elongation plus offset. */
export function readingChances(
  reading: Reading,
  shown: number,
  { noiseSd }: MethodError,
  wrongShare: number,
): Chances {
  const worst = worstPlace(reading);
  if (worst !== undefined) {
    const density = worstOf(reading.values!.length, (worst - shown) / noiseSd) / noiseSd;
    return { sound: (1 - wrongShare) * density, wrong: wrongShare * WRONG_DENSITY };
  }
  const below = reading.upper === undefined ? 1 : normalCdf((reading.upper - shown) / noiseSd);
  const under = reading.lower === undefined ? 0 : normalCdf((reading.lower - shown) / noiseSd);
  return { sound: (1 - wrongShare) * Math.max(below - under, 0), wrong: wrongShare * WRONG_ANSWER };
}
