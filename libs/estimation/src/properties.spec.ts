import fc from 'fast-check';
import { defaultFleetModel, estimateChain, rideFactor } from './index';
import { defaultFactors } from './distance/default-factors';
import type { ChainEstimate, ChainHistory, DueWindow, Reading, Ride, Treatment } from './types';

const TODAY = 20_600;
const RUNS = { numRuns: 12, seed: 11 };
const fleet = defaultFleetModel();

const ride = fc.record<Ride>({
  day: fc.integer({ min: TODAY - 500, max: TODAY + 60 }),
  km: fc.oneof(fc.constant(0), fc.double({ min: 0, max: 300, noNaN: true })),
  surface: fc.constantFrom('road', 'gravel', 'mountain', 'indoor'),
  weather: fc.constantFrom('dry', 'damp', 'wet', 'mud', 'unknown'),
});
const day = fc.integer({ min: TODAY - 400, max: TODAY + 30 });
const number = fc.record({
  id: fc.uuid(),
  day,
  method: fc.constantFrom('steel-rule', 'three-point', 'two-point', 'digital'),
  values: fc.array(fc.double({ min: -0.5, max: 4, noNaN: true }), { minLength: 1, maxLength: 5 }),
});
const answer = fc.record({
  id: fc.uuid(),
  day,
  method: fc.constant('drop-in'),
  lower: fc.constant(0.5),
  upper: fc.constant(0.75),
});
const reading = fc.oneof(number, answer) as fc.Arbitrary<Reading>;
const treatment = fc.record<Treatment>({
  id: fc.uuid(),
  day,
  kind: fc.constantFrom('strip-wax', 're-wax', 'drip-top-up', 'oil-wet', 'oil-dry', 'new-chain'),
  arrival: fc.constantFrom('quiet', 'turning', 'dry', 'not-seen'),
});
const history: fc.Arbitrary<ChainHistory> = fc
  .record({
    rides: fc.array(ride, { maxLength: 60 }),
    readings: fc.array(reading, { maxLength: 5 }),
    treatments: fc.array(treatment, { maxLength: 6 }),
    regime: fc.constantFrom('immersion-wax' as const, 'drip-wax' as const, 'wet-oil' as const),
    shareOfRiding: fc.double({ min: 0, max: 1, noNaN: true }),
  })
  .map(({ rides, ...rest }) => ({
    today: TODAY,
    bikeKind: 'gravel',
    limitPct: 0.75,
    inServiceOn: TODAY - 500,
    rides,
    bikeRides: rides,
    fitted: true,
    planned: [],
    checkpoints: [],
    calendarLimitDays: { 'immersion-wax': 90, 'drip-wax': null, 'wet-oil': 31, 'dry-oil': 31 },
    previous: { day: TODAY - 7, lubricationP50: TODAY + 5, replacementP50: null },
    ...rest,
  }));

const FAR = Number.MAX_SAFE_INTEGER;
const at = (due: number | null) => due ?? FAR;

function numbersIn(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  return value !== null && typeof value === 'object' ? Object.values(value).flatMap(numbersIn) : [];
}

function ordered({ p10, p50, p90, weeklyChance, ...chances }: DueWindow): boolean {
  const total = weeklyChance.reduce((sum, chance) => sum + chance, 0);
  return (
    at(p10) <= at(p50) &&
    at(p50) <= at(p90) &&
    chances.chanceNow <= chances.chanceWithin7 &&
    chances.chanceWithin7 <= chances.chanceWithin14 &&
    chances.chanceWithin14 <= chances.chanceWithin30 &&
    weeklyChance.every((chance) => chance >= -1e-12) &&
    total <= 1 + 1e-9
  );
}

const sound = (estimate: ChainEstimate) => numbersIn(estimate).every(Number.isFinite);

it('answers any finite history with finite numbers and windows in order, the same every time', () => {
  fc.assert(
    fc.property(history, (known) => {
      const estimate = estimateChain(known, fleet);
      expect(sound(estimate)).toBe(true);
      expect(ordered(estimate.replacement)).toBe(true);
      expect(ordered(estimate.lubrication!)).toBe(true);
      const { now, rate, wearKmLeft } = estimate.elongation;
      for (const { p10, p50, p90 } of [now, rate, wearKmLeft, estimate.treatment.life])
        expect(p10 <= p50 && p50 <= p90).toBe(true);
      expect(estimateChain(known, fleet)).toEqual(estimate);
    }),
    RUNS,
  );
});

it('never moves the replacement later for more wear km', () => {
  fc.assert(
    fc.property(history, fc.double({ min: 1, max: 2000, noNaN: true }), (known, km) => {
      const plain = { ...known, readings: known.readings.filter((r) => r.day < TODAY), shareOfRiding: 1 };
      const extra: Ride = { day: TODAY, km, surface: 'road', weather: 'wet' };
      const less = estimateChain(plain, fleet);
      const more = estimateChain({ ...plain, rides: [...plain.rides, extra] }, fleet);
      expect(at(more.replacement.p50)).toBeLessThanOrEqual(at(less.replacement.p50));
      expect(more.elongation.wearKmLeft.p50).toBeLessThanOrEqual(less.elongation.wearKmLeft.p50 + 1e-6);
    }),
    RUNS,
  );
});

it('never lengthens a life for an arrival found dry', () => {
  fc.assert(
    fc.property(history, (known) => {
      const as = (arrival: 'dry' | 'not-seen' | 'quiet') => {
        const last: Treatment = { id: 'last', day: TODAY - 1, kind: 're-wax', arrival };
        return estimateChain({ ...known, treatments: [...known.treatments, last] }, fleet).treatment.life.p50;
      };
      expect(as('dry')).toBeLessThanOrEqual(as('not-seen') + 1e-9);
      expect(as('not-seen')).toBeLessThanOrEqual(as('quiet') + 1e-9);
    }),
    RUNS,
  );
});

it('cancels units: as far on twice the factor is twice as far on the factor', () => {
  fc.assert(
    fc.property(ride, (ridden) => {
      const { weather } = defaultFactors;
      const half = Object.fromEntries(
        Object.entries(weather).map(([key, { lube, wear }]) => [key, { lube: lube / 2, wear: wear / 2 }]),
      ) as typeof weather;
      const whole = rideFactor(ridden, defaultFactors);
      const halved = rideFactor(ridden, { ...defaultFactors, weather: half });
      expect(halved.lube * 2).toBeCloseTo(whole.lube, 12);
      expect(halved.wear * 2).toBeCloseTo(whole.wear, 12);
    }),
    RUNS,
  );
});

it('holds with a thousand readings, with none, and without a single ride', () => {
  const bare = fc.sample(history, { numRuns: 1, seed: 3 })[0]!;
  const many = Array.from({ length: 1000 }, (_, i): Reading => ({
    id: `${i}`,
    day: TODAY - (i % 400),
    method: 'digital',
    values: [0.2 + (i % 10) / 100],
  }));
  expect(sound(estimateChain({ ...bare, readings: many }, fleet))).toBe(true);
  const empty = { ...bare, readings: [], rides: [], bikeRides: [], treatments: [] };
  expect(sound(estimateChain(empty, fleet))).toBe(true);
  expect(estimateChain(empty, fleet).wearKm).toBe(0);
});
