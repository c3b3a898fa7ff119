import { freshUnloggedKm, movedBy } from './moved';
import { unloggedGaps } from '../unlogged';
import type { ChainHistory, Ride } from '../types';

const ride = (day: number, km: number): Ride => ({ day, km, surface: 'road', weather: 'dry' });
const history = (change: Partial<ChainHistory>): ChainHistory => ({
  today: 100,
  bikeKind: 'road',
  regime: 'immersion-wax',
  limitPct: 0.5,
  inServiceOn: 0,
  rides: [],
  bikeRides: [],
  fitted: true,
  shareOfRiding: 1,
  readings: [],
  treatments: [],
  planned: [],
  checkpoints: [],
  calendarLimitDays: { 'immersion-wax': null, 'drip-wax': null, 'wet-oil': null, 'dry-oil': null },
  ...change,
});

it('gives a chain in rotation its share of the unlogged distance', () => {
  const own = [ride(10, 300)];
  const bikeRides = [...own, ride(20, 600)];
  const checkpoints = [
    { day: 0, odometerKm: 0 },
    { day: 50, odometerKm: 1200 },
  ];
  const [gap] = unloggedGaps(history({ rides: own, bikeRides, checkpoints, shareOfRiding: 1 / 3 }));
  expect(gap!.km).toBeCloseTo(100, 10);
  const [all] = unloggedGaps(history({ rides: bikeRides, bikeRides, checkpoints }));
  expect(all).toEqual({ from: 1, to: 50, km: 300 });
});

it('leaves out what was ridden before the chain, and a log that covers its odometer', () => {
  const checkpoints = [
    { day: 0, odometerKm: 0 },
    { day: 50, odometerKm: 500 },
  ];
  expect(unloggedGaps(history({ inServiceOn: 26, checkpoints }))[0]!.km).toBeCloseTo(250, 10);
  const covered = [ride(30, 510)];
  expect(unloggedGaps(history({ rides: covered, bikeRides: covered, checkpoints }))).toEqual([]);
});

it('counts as news only gaps known since, and of them the days after the treatment', () => {
  const gaps = [
    { from: 1, to: 10, km: 50 },
    { from: 11, to: 20, km: 100 },
  ];
  expect(freshUnloggedKm(gaps, 15, -Infinity)).toBe(100);
  expect(freshUnloggedKm(gaps, 15, 15)).toBe(50);
  expect(movedBy(10, 4)).toBe(-6);
  expect(movedBy(null, 4)).toBe(0);
});
