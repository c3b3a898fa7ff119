import type { Weather } from '@halfpitch/contracts';
import { monthOf } from './weather';
import { Random } from './random';

/** Riders whose history shows something particular, by their place in a workshop's list. */
export const SPECIAL = {
  4: 'contradiction',
  5: 'quiet-log',
  6: 'two-weeks',
  7: 'no-rides',
  8: 'keeps-worn-chain',
  9: 'overdue',
  11: 'just-treated',
} as const;
export type Special = (typeof SPECIAL)[keyof typeof SPECIAL];
export const specialOf = (index: number): Special | null => SPECIAL[index as keyof typeof SPECIAL] ?? null;

/** What is the rider's own on whichever bike: how far, how often, how careful with chains and with the log. */
export interface Traits {
  distance: number;
  eagerness: number;
  /** Log effect on how long treatments last on this rider's roads. */
  roadEffect: number;
  /** Comes to the workshop at this share of a treatment's life. */
  comesAt: number;
  /** Share of rides that reach the log. */
  logs: number;
  /** Comes from a device, with a start; else typed in. */
  device: boolean;
  /** Share of rides whose weather nobody noted. */
  weatherUnknown: number;
  hasOdometer: boolean;
  /** Days without riding: holidays, illness, injury. */
  away: readonly (readonly [from: number, to: number])[];
}

function absences(random: Random, from: number, to: number): [number, number][] {
  const away: [number, number][] = [];
  for (let year = from; year <= to; year += 365) {
    if (random.chance(0.7)) {
      const julyFirst = year + ((6 - monthOf(year) + 12) % 12) * 30;
      const start = julyFirst + random.int(0, 50);
      away.push([start, start + random.int(7, 20)]);
    }
    if (random.chance(0.28)) {
      const start = year + random.int(0, 300);
      away.push([start, start + random.int(21, 75)]);
    }
  }
  return away;
}

export function drawTraits(random: Random, from: number, to: number): Traits {
  const device = random.chance(0.55);
  return {
    distance: random.logNormal(1, 0.25),
    eagerness: random.logNormal(1.22, 0.15),
    roadEffect: 0.25 * random.normal(),
    comesAt: random.logNormal(0.88, 0.15),
    logs: random.chance(0.65) ? 1 : random.between(0.72, 0.96),
    device,
    weatherUnknown: device ? random.between(0.2, 0.8) : random.between(0, 0.06),
    hasOdometer: random.chance(0.7),
    away: absences(random, from, to),
  };
}

/** How it was under the wheels, and what the rider wrote down. */
export interface Roads {
  truly: Exclude<Weather, 'unknown'>;
  logged: Weather;
}
