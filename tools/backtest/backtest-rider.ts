import { forecastRiding, isoDay, RiderLog, RidingModel } from '@halfpitch/estimation';

const TARGETS = [
  { km: 300, horizon: 180 },
  { km: 1500, horizon: 540 },
];
const FIRST_ORIGIN = 90;
const STEP = 28;

export interface Forecast {
  rider: string;
  origin: string;
  km: number;
  horizon: number;
  /** Days at the levels .05 .1 .2 … .9 .95, capped at the horizon. */
  q: number[];
}

/**
 * A rider's forecasts at every origin: each 28 days from day 90 on, where the log has 15 ride days by then and a ride in
 * the last 45 days. Only rides before the origin are shown to the forecast.
 */
export function backtestRider({ rider, rides }: RiderLog, model: RidingModel): Forecast[] {
  const days = [...new Set(rides.map(({ day }) => day))].sort((a, b) => a - b);
  const first = days[0] ?? 0;
  const last = days.at(-1) ?? 0;
  const forecasts: Forecast[] = [];
  for (let origin = first + FIRST_ORIGIN; origin < last; origin += STEP) {
    const before = days.filter((day) => day < origin);
    if (before.length < 15 || before.at(-1)! < origin - 45) continue;
    const seen = rides.filter(({ day }) => day < origin);
    const forecast = forecastRiding(seen, origin - 1, model, []);
    for (const { km, horizon } of TARGETS) {
      const q = forecast.daysToReach(km).map((d) => Math.min(d, horizon));
      forecasts.push({ rider, origin: isoDay(origin), km, horizon, q });
    }
  }
  return forecasts;
}
