import type { ChainHistory, Day, Ride } from './types';

/** Km of logged riding that the usual share of a chain counts for, where rotation is judged from a gap's own log. */
const PRIOR_KM = 50;

/** Unlogged km of this chain, spread evenly over the days from..to, both included. */
export interface UnloggedGap {
  from: Day;
  to: Day;
  km: number;
}

const ridden = (rides: readonly Ride[], from: Day, to: Day) =>
  rides.reduce((sum, { day, km }) => sum + (day >= from && day <= to ? km : 0), 0);

/**
 * What the bike's odometer shows beyond its log, gap by gap between checkpoints, as far as it falls to this chain: by its
 * share of the riding logged in the gap, steadied by its usual share, and by the days since it is in service.
 */
export function unloggedGaps(history: ChainHistory): UnloggedGap[] {
  const { checkpoints, bikeRides, rides, today, inServiceOn, shareOfRiding } = history;
  const points = checkpoints.filter(({ day }) => day <= today).sort((a, b) => a.day - b.day);
  return points.slice(1).flatMap((point, i): UnloggedGap[] => {
    const before = points[i]!;
    const days = point.day - before.day;
    const missing = point.odometerKm - before.odometerKm - ridden(bikeRides, before.day + 1, point.day);
    const from = Math.max(before.day + 1, inServiceOn);
    if (missing <= 0 || days <= 0 || from > point.day) return [];
    const onBike = ridden(bikeRides, from, point.day);
    const own = Math.min(ridden(rides, from, point.day), onBike);
    const share = (own + PRIOR_KM * shareOfRiding) / (onBike + PRIOR_KM);
    return [{ from, to: point.day, km: (missing * share * (point.day - from + 1)) / days }];
  });
}
