import { normalQuantile } from '../math/normal';
import type { Day } from '../types';
import type { BlockModel } from './model';

export const BLOCK_DAYS = 28;
const FLEET_STEPS = 9;

export interface Block {
  /** Km on each of its days. */
  km: Float64Array;
  weight: number;
  /** Day of the year of its middle. */
  season: number;
}

/** Daily km from `first` to `today`, both included. */
export function dailyKm(
  rides: readonly { day: Day; km: number }[],
  today: Day,
): { first: Day; km: Float64Array } {
  const past = rides.filter(({ day, km }) => day <= today && km > 0);
  const first = past.reduce((min, { day }) => Math.min(min, day), today);
  const km = new Float64Array(today - first + 1);
  for (const ride of past) km[ride.day - first]! += ride.km;
  return { first, km };
}

/** Four weeks of the log starting every seventh day back from today, the fresher the heavier, and what the fleet rides. */
export function weightedBlocks(
  rides: readonly { day: Day; km: number }[],
  today: Day,
  model: BlockModel,
): Block[] {
  const { first, km } = dailyKm(rides, today);
  const blocks: Block[] = [];
  for (let end = km.length; end >= BLOCK_DAYS; end -= 7) {
    const middle = end - BLOCK_DAYS / 2;
    const age = km.length - end;
    const weight = 0.25 * 2 ** (-age / model.halfLifeDays) + 0.02;
    blocks.push({ km: km.subarray(end - BLOCK_DAYS, end), weight, season: (first + middle) % 365.25 });
  }
  const weeks = Math.max(km.length / 7, 1);
  const own = km.reduce((sum, x) => sum + x, 0) / weeks;
  const typical =
    rides.length > 0 && own > 0 ? Math.sqrt(own * model.fleetWeekKm.median) : model.fleetWeekKm.median;
  for (let i = 0; i < FLEET_STEPS; i++) {
    const week = typical * Math.exp(model.fleetWeekKm.logSd * normalQuantile((i + 0.5) / FLEET_STEPS));
    const even = new Float64Array(BLOCK_DAYS).fill(week / 7);
    blocks.push({ km: even, weight: (model.fleetBlocks * 0.25) / FLEET_STEPS, season: Number.NaN });
  }
  return blocks;
}

/** Weight of a block when the path has come to day-of-year `season`: same season, more weight. */
export function seasonWeight(block: Block, season: number, favour: number): number {
  if (Number.isNaN(block.season)) return block.weight;
  const apart = Math.abs(((block.season - season + 547.875) % 365.25) - 182.625);
  return block.weight * (1 + (favour - 1) * Math.max(0, 1 - apart / 60));
}
