import {
  arrivalConditions,
  bikeKinds,
  regimes,
  readingMethods,
  retiredReasons,
  surfaces,
  treatmentKinds,
  weathers,
} from '@halfpitch/contracts';
import { defaultWearLimitPct } from '@halfpitch/estimation';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { GAUGES } from './gauges';
import type { Household } from './records';
import { DEMO_SIZE, generateScenario } from './scenario';
import { monthOf } from './weather';

const TODAY = '2027-03-15';
const all = (today = TODAY, seed: number = DEMO_SIZE.seed): Household[] =>
  generateScenario({ ...DEMO_SIZE, seed, today }).workshops.flatMap(({ households }) => [...households()]);
const demo = all();
const rides = demo.flatMap((household) => household.rides);
const chains = demo.flatMap((household) => household.chains);
const seen = <T>(values: T[]) => [...new Set(values)].sort();
const sorted = (values: readonly string[]) => [...values].sort();

describe('the demo scenario', () => {
  it('is the same for the same seed, ids included, and another for another', () => {
    expect(all()).toEqual(demo);
    expect(all(TODAY, 1)[0]?.rides).not.toEqual(demo[0]?.rides);
  });

  it('has 40 riders, 60 bikes and 90 chains in service, some bikes with two or three chains in turn', () => {
    expect(demo).toHaveLength(40);
    expect(demo.flatMap(({ bikes }) => bikes)).toHaveLength(60);
    expect(chains.filter(({ retiredOn }) => retiredOn === null)).toHaveLength(90);
    const inTurn = demo.flatMap(({ bikes, fittings, chains: own }) =>
      bikes.map(({ id }) => {
        const running = own.filter(({ retiredOn }) => retiredOn === null);
        return running.filter((c) => fittings.some((f) => f.chainId === c.id && f.bikeId === id)).length;
      }),
    );
    expect(seen(inTurn)).toEqual(expect.arrayContaining([1, 2, 3]));
  });

  it('knows no tomorrow, on whichever day it is made', () => {
    for (const today of [TODAY, '2028-02-29', '2026-12-31']) {
      for (const { rides: own, readings, treatments, odometer, fittings } of all(today)) {
        for (const { day } of [...own, ...readings, ...treatments, ...odometer])
          expect(day < today).toBe(true);
        for (const { fromDay, toDay } of fittings) expect(toDay === null || fromDay <= toDay).toBe(true);
      }
    }
  });

  it('shows every word of the trade', () => {
    expect(seen(rides.map(({ surface }) => surface))).toEqual(sorted(surfaces));
    expect(seen(rides.map(({ weather }) => weather))).toEqual(sorted(weathers));
    expect(seen(demo.flatMap(({ bikes }) => bikes.map(({ kind }) => kind)))).toEqual(sorted(bikeKinds));
    expect(seen(chains.map(({ regime }) => regime))).toEqual(sorted(regimes));
    expect(seen(chains.flatMap(({ retiredBecause }) => retiredBecause ?? []))).toEqual(
      sorted(retiredReasons),
    );
    const treatments = demo.flatMap((household) => household.treatments);
    expect(seen(treatments.map(({ kind }) => kind))).toEqual(sorted(treatmentKinds));
    expect(seen(treatments.map(({ arrival }) => arrival))).toEqual(sorted(arrivalConditions));
    const readings = demo.flatMap((household) => household.readings);
    expect(seen(readings.map(({ method }) => method))).toEqual(sorted(readingMethods));
  });

  it('has riders who never rode, who just began, whose log went quiet, and a chain past its limit', () => {
    const lastRide = (h: Household | undefined) =>
      h?.rides
        .map(({ day }) => day)
        .sort()
        .at(-1) ?? '';
    expect(demo[7]?.rides).toHaveLength(0);
    expect(demo[7]?.chains.length).toBeGreaterThan(0);
    expect(demo[6]?.rides.every(({ day }) => day >= '2027-03-01')).toBe(true);
    expect(demo[6]?.rides.length).toBeGreaterThan(0);
    expect(lastRide(demo[5]) < '2027-02-01').toBe(true);
    expect(demo[5]?.rides.length).toBeGreaterThan(100);
    const past = demo.flatMap(({ chains: own, truth }) =>
      own.filter((chain) => {
        const truly = truth.chains.find(({ chainId }) => chainId === chain.id)?.elongationPct ?? 0;
        return chain.retiredOn === null && truly > defaultWearLimitPct(chain.speeds);
      }),
    );
    expect(past.length).toBeGreaterThan(0);
    expect(demo.flatMap(({ truth }) => truth.readings.filter((r) => r.contradictory)).length).toBeGreaterThan(
      0,
    );
  });

  it('reads chains as its gauges do: mean error within four standard errors, spread as stated', () => {
    const large = generateScenario({
      seed: 5,
      today: TODAY,
      workshops: 1,
      riders: 200,
      bikes: 300,
      chains: 400,
      years: 1,
    });
    const errors = [...(large.workshops[0]?.households() ?? [])].flatMap(({ readings, truth }) =>
      readings.flatMap((reading, i) => {
        const truly = truth.readings[i];
        if (!truly || truly.contradictory) return [];
        return (reading.valuesPct ?? []).map((value) => ({
          method: reading.method,
          z:
            (value - truly.elongationPct - truly.offsetPct) /
            Math.hypot(GAUGES[reading.method].noiseSd, GAUGES[reading.method].step / Math.sqrt(12)),
        }));
      }),
    );
    for (const method of ['steel-rule', 'three-point', 'two-point', 'digital'] as const) {
      const z = errors.filter((error) => error.method === method).map((error) => error.z);
      const mean = z.reduce((sum, x) => sum + x, 0) / z.length;
      const sd = Math.sqrt(z.reduce((sum, x) => sum + (x - mean) ** 2, 0) / (z.length - 1));
      expect(z.length).toBeGreaterThan(100);
      expect(Math.abs(mean)).toBeLessThan(4 / Math.sqrt(z.length));
      expect(sd).toBeGreaterThan(1 - 4 / Math.sqrt(2 * z.length));
      expect(sd).toBeLessThan(1 + 4 / Math.sqrt(2 * z.length));
    }
  });

  it('rains as it does in a rainy town, month by month, and in runs', () => {
    // seattle-weather.csv, npm vega-datasets (BSD-3-Clause), 2012-15: days with 1 mm and more; read.
    const source = readFileSync(
      join(__dirname, '../../../../node_modules/vega-datasets/data/seattle-weather.csv'),
      'utf8',
    );
    const days = source
      .trim()
      .split('\n')
      .slice(1)
      .map((line) => line.split(','));
    const town = generateScenario({ ...DEMO_SIZE, today: TODAY, years: 40 }).workshops[0]?.weather ?? [];
    for (let month = 0; month < 12; month++) {
      const real = days.filter(([date = '']) => monthOf(Date.parse(date) / 86_400_000) === month);
      const realShare = real.filter(([, rain]) => Number(rain) >= 1).length / real.length;
      const own = town.filter((day) => day.month === month);
      const ownShare = own.filter(({ wet }) => wet).length / own.length;
      expect(Math.abs(ownShare - realShare)).toBeLessThan(0.1);
    }
    const afterRain = town.filter((day) => day.afterRain);
    const afterDry = town.filter((day) => !day.afterRain);
    const wetShare = (of: typeof town) => of.filter(({ wet }) => wet).length / of.length;
    // The same source: 61 % of days after a wet one are wet, 21 % of those after a dry one; computed.
    expect(wetShare(afterRain)).toBeCloseTo(0.61, 1);
    expect(wetShare(afterDry)).toBeCloseTo(0.21, 1);
  });
});
