import type { Dryness } from '@halfpitch/contracts';

/** From which share of a treatment used a chain is called turning, and beyond which dry. */
const TURNING_FROM = 0.6;
const DRY_BEYOND = 1;

/** The word for a share of the treatment used: fresh below 0.6, turning to 1, dry beyond. */
export function drynessOf(share: number): Dryness {
  if (share > DRY_BEYOND) return 'dry';
  return share >= TURNING_FROM ? 'turning' : 'fresh';
}

export const drynessWords: Record<Dryness, string> = { fresh: 'Fresh', turning: 'Turning', dry: 'Dry' };

export const drynessColour = (dryness: Dryness) => `var(--hp-colors-dryness-${dryness})`;

const mixed = (from: Dryness, to: Dryness, part: number) =>
  `color-mix(in oklab, ${drynessColour(to)} ${Math.round(part * 100)}%, ${drynessColour(from)})`;

const between = (low: number, x: number, high: number) => Math.min(1, Math.max(0, (x - low) / (high - low)));

/** The ramp's colour at a share used: deep blue-green, through sand about 0.8, to rust from 1.15. */
export function rampColour(share: number): string {
  if (share < 0.85) return mixed('fresh', 'turning', between(0.4, share, 0.75));
  return mixed('turning', 'dry', between(0.9, share, 1.15));
}
