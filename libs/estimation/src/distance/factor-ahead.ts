import type { ChainHistory, Factor, Factors } from '../types';
import { factorTable } from './factor-table';

/** Ordinary riding that a short log is steadied by: 200 km that count for 1.15 times as much (our judgement). */
const STEADY = { km: 200, factor: 1.15 };

/** What a km ahead will count for: the last year's rides on this bike, steadied by some ordinary riding. */
export function factorAhead({ bikeRides, rides, today }: ChainHistory, factors: Factors): Factor {
  const factorOf = factorTable(factors);
  const sums = { km: STEADY.km, lube: STEADY.km * STEADY.factor, wear: STEADY.km * STEADY.factor };
  for (const ride of bikeRides.length > 0 ? bikeRides : rides) {
    if (ride.day > today || ride.day <= today - 365) continue;
    const factor = factorOf(ride);
    sums.km += ride.km;
    sums.lube += ride.km * factor.lube;
    sums.wear += ride.km * factor.wear;
  }
  return { lube: sums.lube / sums.km, wear: sums.wear / sums.km };
}
