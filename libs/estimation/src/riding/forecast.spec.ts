import fc from 'fast-check';
import { seededRandom } from '../math/random';
import type { Day } from '../types';
import { defaultRidingModel } from './default-model';
import { fitRidingModel } from './fit';
import { forecastRiding } from './forecast';

const today: Day = 20_000;
const everyThirdDay = Array.from({ length: 120 }, (_, i) => ({ day: today - 3 * i, km: 30 }));
const median = (days: readonly number[]) => days[5]!;

const someRides = fc.array(
  fc.record({
    day: fc.integer({ min: today - 1200, max: today + 200 }),
    km: fc.double({ min: 0, max: 300, noNaN: true }),
  }),
  { maxLength: 200 },
);

describe('forecastRiding', () => {
  it('takes about as long as the rider’s own rate says, where the rate is steady', () => {
    const days = median(forecastRiding(everyThirdDay, today, defaultRidingModel, []).daysToReach(300));
    expect(days).toBeGreaterThan(21);
    expect(days).toBeLessThan(45);
  });

  it('gives ordered, finite days for any log, more for more km, never beyond two years', () => {
    fc.assert(
      fc.property(someRides, fc.double({ min: 1, max: 20_000, noNaN: true }), (rides, km) => {
        const forecast = forecastRiding(rides, today, defaultRidingModel, []);
        const days = forecast.daysToReach(km);
        const more = forecast.daysToReach(km * 1.1);
        for (let l = 0; l < days.length; l++) {
          expect(Number.isFinite(days[l])).toBe(true);
          expect(days[l]!).toBeLessThanOrEqual(731);
          expect(more[l]!).toBeGreaterThanOrEqual(days[l]! - 1e-9);
          if (l > 0) expect(days[l]!).toBeGreaterThanOrEqual(days[l - 1]!);
        }
      }),
      { seed: 1, numRuns: 60 },
    );
  });

  it('sees nothing that lies after today', () => {
    const future = [...everyThirdDay, { day: today + 1, km: 250 }];
    const seen = forecastRiding(everyThirdDay, today, defaultRidingModel, []).daysToReach(500);
    expect(forecastRiding(future, today, defaultRidingModel, []).daysToReach(500)).toEqual(seen);
  });

  it('reaches a distance earlier with planned riding, and at once when the plan alone covers it', () => {
    const without = median(forecastRiding(everyThirdDay, today, defaultRidingModel, []).daysToReach(600));
    const plan = [{ from: today + 3, to: today + 9, km: 600 }];
    const withPlan = forecastRiding(everyThirdDay, today, defaultRidingModel, plan).daysToReach(600);
    expect(median(withPlan)).toBeLessThan(without);
    expect(withPlan[10]!).toBeLessThanOrEqual(9);
  });

  it('answers widely for two weeks of log, and for none', () => {
    const short = forecastRiding(everyThirdDay.slice(0, 4), today, defaultRidingModel, []).daysToReach(300);
    expect(short[9]! / short[1]!).toBeGreaterThan(2);
    const none = forecastRiding([], today, defaultRidingModel, []);
    expect(none.quiet).toBe(false);
    expect(none.daysToReach(300)[9]! / none.daysToReach(300)[1]!).toBeGreaterThan(3);
  });

  it('says when a log has gone quiet, and is less sure then', () => {
    const stopped = everyThirdDay.map(({ day, km }) => ({ day: day - 60, km }));
    const quiet = forecastRiding(stopped, today, defaultRidingModel, []);
    const riding = forecastRiding(everyThirdDay, today, defaultRidingModel, []);
    expect([quiet.quiet, riding.quiet]).toEqual([true, false]);
    const width = (days: readonly number[]) => Math.log(days[8]! / days[2]!);
    expect(width(quiet.daysToReach(300))).toBeGreaterThan(width(riding.daysToReach(300)));
  });
});

describe('fitRidingModel', () => {
  /** A rider who rides each day with a chance that follows the season and a mood of some weeks. */
  function invented(seed: number) {
    const random = seededRandom(seed);
    const habit = 0.2 + 0.5 * random();
    let mood = 1;
    return Array.from({ length: 900 }, (_, i) => {
      if (i % 21 === 0) mood = 0.4 + 1.2 * random();
      const season = 1 + 0.5 * Math.sin((2 * Math.PI * (i - 80)) / 365);
      return { day: today - 900 + i, km: random() < habit * season * mood ? 15 + 40 * random() : 0 };
    });
  }

  it('holds on riders it was not taught on about as often as it says', () => {
    const riders = Array.from({ length: 8 }, (_, i) => ({ rider: `r${i}`, rides: invented(i + 1) }));
    const model = fitRidingModel(riders, null);
    let inside = 0;
    let all = 0;
    for (let seed = 101; seed <= 112; seed++) {
      const rides = invented(seed);
      for (let origin = 200; origin <= 700; origin += 50) {
        const now = today - 900 + origin;
        const days = forecastRiding(rides.slice(0, origin), now - 1, model, []).daysToReach(300);
        let km = 0;
        let taken = 0;
        for (let i = origin; i < 900 && km < 300; i++, taken++) km += rides[i]!.km;
        if (km < 300) continue;
        all++;
        if (taken >= Math.floor(days[1]!) && taken <= Math.ceil(days[9]!)) inside++;
      }
    }
    expect(all).toBeGreaterThan(100);
    expect(inside / all).toBeGreaterThan(0.7);
    expect(inside / all).toBeLessThan(0.92);
    expect(JSON.parse(JSON.stringify(model))).toEqual(model);
  }, 120_000);

  it('stays near what is shipped with one rider, keeps it with none, and gives the same digits each time', () => {
    const one = [{ rider: 'one', rides: invented(5) }];
    const fitted = fitRidingModel(one);
    expect(fitRidingModel(one)).toEqual(fitted);
    expect(fitRidingModel([])).toEqual(defaultRidingModel);
    const days = (model: typeof fitted) =>
      Math.log(median(forecastRiding(everyThirdDay, today, model, []).daysToReach(600)));
    expect(Math.abs(days(fitted) - days(defaultRidingModel))).toBeLessThan(0.2);
  }, 120_000);
});
