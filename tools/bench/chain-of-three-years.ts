import type { ChainHistory, Reading, ReadingMethod, Ride, Treatment } from '@halfpitch/estimation';

const METHODS: readonly ReadingMethod[] = ['three-point', 'drop-in', 'steel-rule', 'digital'];
const YEARS = 3;

/** A generated chain with three years of rides, a dozen readings by four methods and forty treatments. */
export function chainOfThreeYears(ridesAYear: number): ChainHistory {
  const today = 20_600;
  const inServiceOn = today - YEARS * 365;
  const count = YEARS * ridesAYear;
  const rides = Array.from({ length: count }, (_, i): Ride => {
    const day = inServiceOn + Math.floor((i * YEARS * 365) / count);
    const weather = (['dry', 'dry', 'unknown', 'wet', 'damp'] as const)[i % 5]!;
    return { day, km: 8000 / ridesAYear + 5 * (i % 7), surface: i % 9 === 0 ? 'gravel' : 'road', weather };
  });
  const readings = Array.from({ length: 12 }, (_, i): Reading => {
    const method = METHODS[i % METHODS.length]!;
    const day = inServiceOn + 90 * (i + 1);
    const shown = 0.03 + 0.03 * i;
    const found =
      method === 'drop-in'
        ? { lower: i < 8 ? undefined : 0.25, upper: 0.75 }
        : { values: [shown, shown - 0.02] };
    return { id: `r${i}`, day, method, ...found };
  });
  const treatments = Array.from({ length: 40 }, (_, i): Treatment => {
    const arrival = (['quiet', 'turning', 'dry', 'not-seen'] as const)[i % 4]!;
    return {
      id: `t${i}`,
      day: inServiceOn + 27 * (i + 1),
      kind: i % 8 === 0 ? 'strip-wax' : 're-wax',
      arrival,
    };
  });
  return {
    today,
    bikeKind: 'road',
    regime: 'immersion-wax',
    limitPct: 0.5,
    inServiceOn,
    rides,
    bikeRides: rides,
    fitted: true,
    shareOfRiding: 1,
    readings,
    treatments,
    planned: [{ from: today + 10, to: today + 16, km: 400 }],
    checkpoints: Array.from({ length: 8 }, (_, i) => ({ day: inServiceOn + 130 * i, odometerKm: 4200 * i })),
    calendarLimitDays: { 'immersion-wax': null, 'drip-wax': null, 'wet-oil': 31, 'dry-oil': 31 },
    previous: { day: today - 7, lubricationP50: today + 9, replacementP50: today + 200 },
  };
}
