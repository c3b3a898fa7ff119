import { equivalentKm } from './distance/equivalent-km';
import type { ChainHistory, Day, Factors } from './types';

/** A chain's distance so far, by day: what every reading and treatment is placed on. */
export interface Usage {
  totalKm: number;
  wearKm: number;
  unloggedKm: number;
  /** Wear km ridden before the end of `day`. */
  wearKmAt(day: Day): number;
  /** Lube km ridden after `from` and up to the end of `to`. */
  lubeKmBetween(from: Day, to: Day): number;
}

/** Running sums over days; unlogged distance is spread evenly over the gap between its odometer checkpoints. */
export function chainUsage(history: ChainHistory, factors: Factors): Usage {
  const { today, inServiceOn } = history;
  const rides = history.rides.filter(({ day }) => day <= today).sort((a, b) => a.day - b.day);
  const start = Math.min(inServiceOn, rides[0]?.day ?? today, today);
  const length = today - start + 1;
  const lube = new Float64Array(length);
  const wear = new Float64Array(length);
  let totalKm = 0;
  for (const ride of rides) {
    const { lubeKm, wearKm } = equivalentKm(ride, factors);
    totalKm += ride.km;
    lube[ride.day - start]! += lubeKm;
    wear[ride.day - start]! += wearKm;
  }
  const unloggedKm = addUnlogged(history, start, lube, wear, totalKm);
  for (let d = 1; d < length; d++) {
    lube[d]! += lube[d - 1]!;
    wear[d]! += wear[d - 1]!;
  }
  const at = (sums: Float64Array, day: Day) => (day < start ? 0 : sums[Math.min(day - start, length - 1)]!);
  return {
    totalKm: totalKm + unloggedKm,
    wearKm: at(wear, today),
    unloggedKm,
    wearKmAt: (day) => at(wear, day),
    lubeKmBetween: (from, to) => Math.max(at(lube, to) - at(lube, from), 0),
  };
}

function addUnlogged(
  { checkpoints, bikeRides, today, inServiceOn }: ChainHistory,
  start: Day,
  lube: Float64Array,
  wear: Float64Array,
  km: number,
): number {
  const points = checkpoints.filter(({ day }) => day <= today).sort((a, b) => a.day - b.day);
  const lubePerKm = km > 0 ? sum(lube) / km : 1;
  const wearPerKm = km > 0 ? sum(wear) / km : 1;
  let unlogged = 0;
  points.slice(1).forEach((point, i) => {
    const before = points[i]!;
    const logged = bikeRides.reduce(
      (total, ride) => total + (ride.day > before.day && ride.day <= point.day ? ride.km : 0),
      0,
    );
    const missing = point.odometerKm - before.odometerKm - logged;
    const days = point.day - before.day;
    if (missing <= 0 || days <= 0) return;
    for (let day = Math.max(before.day + 1, inServiceOn); day <= point.day; day++) {
      lube[day - start]! += (missing / days) * lubePerKm;
      wear[day - start]! += (missing / days) * wearPerKm;
      unlogged += missing / days;
    }
  });
  return unlogged;
}

const sum = (values: Float64Array) => values.reduce((total, x) => total + x, 0);
