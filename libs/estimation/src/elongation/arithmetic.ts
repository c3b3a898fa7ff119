import { assertWithin } from '../errors';

/** Half an inch, the pitch of a bicycle chain, mm (ISO 9633; figure from memory). */
export const PITCH_MM = 12.7;

/** Elongation in % of `measuredMm` over `pitches` pitches: 100 (measured − n·12.7) / (n·12.7). */
export function elongationPct(measuredMm: number, pitches: number): number {
  assertWithin('The number of pitches', pitches, 1, 200);
  const nominal = pitches * PITCH_MM;
  assertWithin('The measured length in mm', measuredMm, nominal * 0.9, nominal * 1.1);
  return (100 * (measuredMm - nominal)) / nominal;
}

/** Elongation in % when the pin stands `fraction` inch beyond the nominal length, over 24 pitches (12 in) by default. */
export function elongationFromInches(fraction: number, pitches = 24): number {
  assertWithin('The excess in inches', fraction, -0.5, 1);
  return elongationPct((pitches / 2 + fraction) * 25.4, pitches);
}
