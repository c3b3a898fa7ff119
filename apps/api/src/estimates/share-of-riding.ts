import type { ChainRow, RideGroup } from './history-rows';

/** Below this many km there is no telling how a bike's chains are rotated. */
const FEW_KM = 100;

/**
 * The share of its bike's riding that a chain carries, 0 to 1: of what was ridden in the last year, since the chain
 * went into service, on chains that still run. What retired chains carried falls to those that are left.
 */
export function shareOfRiding(
  { id, inServiceOn }: Pick<ChainRow, 'id' | 'inServiceOn'>,
  onBike: readonly RideGroup[],
  today: number,
): number {
  const from = Math.max(inServiceOn, today - 365);
  const sums = { own: 0, all: 0 };
  for (const { chainId, inService, rides } of onBike) {
    if (!inService || chainId === null) continue;
    const km = rides.reduce((sum, ride) => sum + (ride.day >= from && ride.day <= today ? ride.km : 0), 0);
    sums.all += km;
    if (chainId === id) sums.own += km;
  }
  return sums.all < FEW_KM ? 1 : sums.own / sums.all;
}
