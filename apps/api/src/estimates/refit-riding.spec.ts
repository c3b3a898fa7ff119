import { dayOf, defaultRidingModel, forecastRiding } from '@halfpitch/estimation';
import type { RiderLog, RidingModel } from '@halfpitch/estimation';
import { DEMO_SIZE, generateScenario } from '../demo/scenario';
import { refitRiding } from './refit-riding';

const LEVELS = [0.05, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.95];

/** Generated riders, one log each. */
function generated(): RiderLog[] {
  const { workshops } = generateScenario({ ...DEMO_SIZE, today: '2026-12-01' });
  return workshops
    .flatMap((part) => [...part.households()])
    .map(({ rider, rides }) => ({
      rider: rider.id,
      rides: rides.map(({ day, distanceM }) => ({ day: dayOf(day), km: distanceM / 1000 })),
    }));
}

/** Mean pinball loss of the days to 300 km over a log's later months, days. */
function loss(logs: readonly RiderLog[], model: RidingModel): number {
  let [sum, n] = [0, 0];
  for (const { rides } of logs) {
    const last = Math.max(...rides.map(({ day }) => day));
    for (let origin = last - 420; origin < last - 180; origin += 40) {
      const seen = rides.filter(({ day }) => day < origin);
      const ahead = rides.filter(({ day }) => day >= origin).sort((a, b) => a.day - b.day);
      if (seen.length < 15) continue;
      let km = 0;
      const reached = ahead.find((ride) => (km += ride.km) >= 300);
      const days = Math.min(reached ? reached.day - origin + 1 : 180, 180);
      const quantiles = forecastRiding(seen, origin - 1, model, []).daysToReach(300);
      LEVELS.forEach((level, l) => {
        const miss = days - Math.min(quantiles[l]!, 180);
        sum += Math.max(level * miss, (level - 1) * miss);
        n++;
      });
    }
  }
  return sum / n;
}

it('forecasts riders it was not taught on at least as well as the shipped model', async () => {
  const logs = generated();
  const taught = await refitRiding(logs.filter((_, i) => i % 3 === 0));
  expect(taught.riders).toBeGreaterThanOrEqual(10);
  const others = logs.filter((_, i) => i % 3 === 1);
  expect(loss(others, taught)).toBeLessThanOrEqual(loss(others, defaultRidingModel));
});

it('stays with the shipped model where there are few riders', async () => {
  expect(await refitRiding(generated().slice(0, 9))).toBe(defaultRidingModel);
});
