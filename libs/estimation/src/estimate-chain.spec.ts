import { dayOf, defaultFleetModel, estimateChain, isoDay } from './index';
import type { ChainHistory, Ride } from './types';

const today = dayOf('2026-06-01');

/** A waxed road chain ridden 120 km a week, twice a week, since the first of January. */
function waxedRoadChain(change: Partial<ChainHistory> = {}): ChainHistory {
  const rides: Ride[] = [];
  for (let day = dayOf('2026-01-01'); day <= today; day++) {
    if (day % 7 === 2 || day % 7 === 5) rides.push({ day, km: 60, surface: 'road', weather: 'dry' });
  }
  return {
    today,
    bikeKind: 'road',
    regime: 'immersion-wax',
    limitPct: 0.5,
    inServiceOn: dayOf('2026-01-01'),
    rides,
    bikeRides: rides,
    fitted: true,
    shareOfRiding: 1,
    readings: [],
    treatments: [{ id: 't1', day: today - 3, kind: 're-wax', arrival: 'not-seen' }],
    planned: [],
    checkpoints: [],
    calendarLimitDays: { 'immersion-wax': null, 'drip-wax': null, 'wet-oil': 31, 'dry-oil': 31 },
    ...change,
  };
}

describe('estimateChain', () => {
  it('gives a window for re-waxing that a mechanic would believe: about two to three weeks after the last', () => {
    const { lubrication } = estimateChain(waxedRoadChain(), defaultFleetModel());
    const days = lubrication!.p50! - today;
    expect(days).toBeGreaterThan(9);
    expect(days).toBeLessThan(24);
    expect(lubrication!.p10!).toBeLessThan(lubrication!.p50!);
    expect(lubrication!.p90!).toBeGreaterThan(lubrication!.p50!);
  });

  it('replaces a waxed chain at 0.5 % after some 8,000 to 13,000 km', () => {
    const { elongation, wearKm } = estimateChain(waxedRoadChain(), defaultFleetModel());
    expect(wearKm + elongation.wearKmLeft.p50).toBeGreaterThan(8000);
    expect(wearKm + elongation.wearKmLeft.p50).toBeLessThan(13_000);
  });

  it('is the same to the digit when asked twice', () => {
    const once = estimateChain(waxedRoadChain(), defaultFleetModel());
    expect(estimateChain(waxedRoadChain(), defaultFleetModel())).toEqual(once);
  });

  it('says why a window moved: two wet rides', () => {
    const history = waxedRoadChain();
    const before = estimateChain(history, defaultFleetModel());
    const wet: Ride[] = [1, 2].map((d) => ({ day: today + d, km: 40, surface: 'road', weather: 'wet' }));
    const later = estimateChain(
      {
        ...history,
        today: today + 2,
        rides: [...history.rides, ...wet],
        bikeRides: [...history.bikeRides, ...wet],
        previous: {
          day: today,
          lubricationP50: before.lubrication!.p50,
          replacementP50: before.replacement.p50,
        },
      },
      defaultFleetModel(),
    );
    const reason = later.reasons.find(({ code }) => code === 'wet-rides');
    expect(reason?.data).toEqual({ rides: 2, km: 80 });
    expect(reason!.days).toBeLessThan(-2);
    expect(later.lubrication!.p50!).toBeLessThan(before.lubrication!.p50!);
    expect(later.alerts.map(({ code }) => code)).toContain('wet-ride-rust');
  });

  it('knows of a chain in the box that riding does not use it up', () => {
    expect(estimateChain(waxedRoadChain({ fitted: false }), defaultFleetModel()).lubrication).toBeNull();
  });

  it('lets the calendar decide where it comes first', () => {
    const limits = { 'immersion-wax': 5, 'drip-wax': null, 'wet-oil': null, 'dry-oil': null };
    const { lubrication } = estimateChain(waxedRoadChain({ calendarLimitDays: limits }), defaultFleetModel());
    expect(isoDay(lubrication!.p90!)).toBe(isoDay(today + 2));
    expect(lubrication!.decidedBy).toBe('calendar');
  });
});
