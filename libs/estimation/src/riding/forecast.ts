import { seededRandom } from '../math/random';
import { weightedBand } from '../math/weighted';
import { Day, LEVELS, PlannedRiding, RidingForecast, RidingModel } from '../types';
import { Block, BLOCK_DAYS, dailyKm, seasonWeight, weightedBlocks } from './blocks';
import { BlockModel, defaultRidingModel, HORIZON_DAYS } from './model';

const PATHS = 120;

function pick(blocks: readonly Block[], weights: readonly number[], total: number, u: number): Block {
  let rest = u * total;
  for (let i = 0; i < blocks.length; i++) {
    rest -= weights[i]!;
    if (rest <= 0) return blocks[i]!;
  }
  return blocks[blocks.length - 1]!;
}

/** Cumulative km at the end of each day ahead, on each of PATHS possible futures made of blocks of the past. */
function futures(blocks: readonly Block[], today: Day, model: BlockModel): Float64Array[] {
  const random = seededRandom(1);
  const steps = Math.ceil(HORIZON_DAYS / BLOCK_DAYS);
  const paths = Array.from({ length: PATHS }, () => new Float64Array(steps * BLOCK_DAYS));
  for (let step = 0; step < steps; step++) {
    const season = (today + step * BLOCK_DAYS + BLOCK_DAYS / 2) % 365.25;
    const weights = blocks.map((block) => seasonWeight(block, season, model.seasonFavour));
    const total = weights.reduce((sum, w) => sum + w, 0);
    for (const path of paths) {
      const { km } = pick(blocks, weights, total, random());
      let sum = step === 0 ? 0 : path[step * BLOCK_DAYS - 1]!;
      for (let d = 0; d < BLOCK_DAYS; d++) path[step * BLOCK_DAYS + d] = sum += km[d]!;
    }
  }
  return paths;
}

/** First index at which an ascending array reaches `km`. */
function firstReaching(path: Float64Array, km: number): number {
  let low = 0;
  let high = path.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (path[middle]! >= km) high = middle;
    else low = middle + 1;
  }
  return low;
}

function addPlanned(paths: Float64Array[], today: Day, planned: readonly PlannedRiding[]): void {
  for (const { from, to, km } of planned) {
    const daily = km / (to - from + 1);
    for (const path of paths) {
      let extra = 0;
      for (let d = 0; d < path.length; d++) {
        const day = today + 1 + d;
        if (day >= from && day <= to) extra += daily;
        path[d]! += extra;
      }
    }
  }
}

/** The riding ahead of one bike: possible futures resampled from four-week blocks of its own log, recency and season favoured. */
export function forecastRiding(
  rides: readonly { day: Day; km: number }[],
  today: Day,
  model: RidingModel,
  planned: readonly PlannedRiding[],
): RidingForecast {
  const settings = { ...defaultRidingModel, ...model } as BlockModel;
  const paths = futures(weightedBlocks(rides, today, settings), today, settings);
  addPlanned(paths, today, planned);
  const ones = paths.map(() => 1);
  return {
    daysToReach(km) {
      if (km <= 0) return LEVELS.map(() => 0);
      const days = paths
        .map((path) => Math.min(firstReaching(path, km) + 1, HORIZON_DAYS))
        .sort((a, b) => a - b);
      return LEVELS.map((level) => days[Math.min(Math.floor(level * PATHS), PATHS - 1)]!);
    },
    kmPerWeek: weightedBand(
      paths.map((path) => path[BLOCK_DAYS - 1]! / 4),
      ones,
    ),
    quiet: isQuiet(rides, today),
  };
}

/** A log is quiet when the pause is longer than 21 days and than nineteen in twenty of this rider's pauses. */
function isQuiet(rides: readonly { day: Day; km: number }[], today: Day): boolean {
  const { km } = dailyKm(rides, today);
  const gaps: number[] = [];
  let gap = 0;
  for (const x of km) {
    if (x > 0) {
      gaps.push(gap);
      gap = 0;
    } else gap++;
  }
  const usual = gaps.sort((a, b) => a - b)[Math.floor(gaps.length * 0.95)] ?? 0;
  return rides.length > 0 && gap > Math.max(21, usual);
}
