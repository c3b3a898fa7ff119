import { ChainHistory, dayOf, defaultWearLimitPct, Ride as KnownRide } from '@halfpitch/estimation';
import type { Chain } from '../chains/chain.entity';
import type { Ride } from '../rides/ride.entity';
import type { StoredSettings } from '../workshop/workshop.entity';
import type { Household } from './records';

const known = ({ day, distanceM, surface, weather }: Ride): KnownRide => ({
  day: dayOf(day),
  km: distanceM / 1000,
  surface,
  weather,
});

/** A chain as it was known at the end of `today`, a day of the past; null where it was not in service then. */
export function historyAsOf(
  household: Household,
  chain: Chain,
  today: string,
  settings: StoredSettings,
): ChainHistory | null {
  if (chain.inServiceOn > today || (chain.retiredOn !== null && chain.retiredOn <= today)) return null;
  const past = <T extends { day: string }>(rows: readonly T[]) => rows.filter(({ day }) => day <= today);
  const fittings = household.fittings.filter(({ fromDay }) => fromDay <= today);
  const own = fittings.filter(({ chainId }) => chainId === chain.id);
  const last = own.at(-1);
  const bike = household.bikes.find(({ id }) => id === last?.bikeId);
  const inService = household.chains.filter((c) => c.retiredOn === null || c.retiredOn > today);
  const turns = new Set(fittings.filter(({ bikeId }) => bikeId === bike?.id).map(({ chainId }) => chainId));
  const rotation = inService.filter(({ id }) => turns.has(id)).length;
  const rides = past(household.rides);
  return {
    today: dayOf(today),
    bikeKind: bike?.kind ?? 'road',
    regime: chain.regime,
    limitPct: chain.wearLimitPct ?? defaultWearLimitPct(chain.speeds),
    inServiceOn: dayOf(chain.inServiceOn),
    rides: rides.filter(({ chainId }) => chainId === chain.id).map(known),
    bikeRides: rides.filter(({ bikeId }) => bikeId === bike?.id).map(known),
    fitted: last !== undefined && (last.toDay === null || last.toDay >= today),
    shareOfRiding: 1 / Math.max(rotation, 1),
    readings: past(household.readings)
      .filter(({ chainId }) => chainId === chain.id)
      .map(({ id, day, method, valuesPct, lowerPct, upperPct, baseline }) => ({
        id,
        day: dayOf(day),
        method,
        values: valuesPct ?? undefined,
        lower: lowerPct ?? undefined,
        upper: upperPct ?? undefined,
        baseline,
      })),
    treatments: past(household.treatments)
      .filter(({ chainId }) => chainId === chain.id)
      .map(({ id, day, kind, arrival }) => ({ id, day: dayOf(day), kind, arrival })),
    planned: [],
    checkpoints: past(household.odometer)
      .filter(({ bikeId }) => bikeId === bike?.id)
      .map(({ day, odometerM }) => ({ day: dayOf(day), odometerKm: odometerM / 1000 })),
    calendarLimitDays: settings.calendarLimitDays,
  };
}
