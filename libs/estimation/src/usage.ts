import { factorTable } from './distance/factor-table';
import type { ChainHistory, Day, Factors } from './types';
import { unloggedGaps, UnloggedGap } from './unlogged';

/** A chain's distance so far, by day: what every reading and treatment is placed on. */
export interface Usage {
  totalKm: number;
  wearKm: number;
  unloggedKm: number;
  /** Unlogged distance by gap, for the reasons. */
  unlogged: readonly UnloggedGap[];
  /** Wear km ridden before the end of `day`. */
  wearKmAt(day: Day): number;
  /** Lube km ridden after `from` and up to the end of `to`. */
  lubeKmBetween(from: Day, to: Day): number;
}

/** Running sums over days, unlogged distance at what a logged km of this chain counts for on average. */
export function chainUsage(history: ChainHistory, factors: Factors): Usage {
  const { today, inServiceOn, rides } = history;
  const start = rides.reduce((first, { day }) => Math.min(first, day), Math.min(inServiceOn, today));
  const length = today - start + 1;
  const lube = new Float64Array(length);
  const wear = new Float64Array(length);
  const factorOf = factorTable(factors);
  const sums = { km: 0, lube: 0, wear: 0 };
  for (const ride of rides) {
    if (ride.day > today) continue;
    const factor = factorOf(ride);
    lube[ride.day - start]! += ride.km * factor.lube;
    wear[ride.day - start]! += ride.km * factor.wear;
    sums.km += ride.km;
    sums.lube += ride.km * factor.lube;
    sums.wear += ride.km * factor.wear;
  }
  const unlogged = unloggedGaps(history);
  let unloggedKm = 0;
  for (const { from, to, km } of unlogged) {
    const daily = km / (to - from + 1);
    for (let day = from; day <= to; day++) {
      lube[day - start]! += daily * (sums.km > 0 ? sums.lube / sums.km : 1);
      wear[day - start]! += daily * (sums.km > 0 ? sums.wear / sums.km : 1);
    }
    unloggedKm += km;
  }
  for (let d = 1; d < length; d++) {
    lube[d]! += lube[d - 1]!;
    wear[d]! += wear[d - 1]!;
  }
  const at = (running: Float64Array, day: Day) =>
    day < start ? 0 : running[Math.min(day - start, length - 1)]!;
  return {
    totalKm: sums.km + unloggedKm,
    wearKm: at(wear, today),
    unloggedKm,
    unlogged,
    wearKmAt: (day) => at(wear, day),
    lubeKmBetween: (from, to) => Math.max(at(lube, to) - at(lube, from), 0),
  };
}
