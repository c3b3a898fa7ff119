import { LifeDistribution, lifeQuantile } from '../life/rider-life';
import type { Day, DueWindow, RidingForecast } from '../types';
import { dueCdf, dueWindow } from './due-distribution';
import { atomsOf } from './km-left';

/** What the window of the present treatment is made of. */
export interface RunningTreatment {
  life: LifeDistribution;
  since: Day;
  lubeKmUsed: number;
  /** Lube km that a km ahead counts for. */
  lubePerKm: number;
  /** Days after which the calendar says so, whatever was ridden. */
  limitDays: number | null;
}

/** When the present treatment is spent, by distance or calendar, and when one given today would be. */
export function lubricationWindow(
  { life, since, lubeKmUsed, lubePerKm, limitDays }: RunningTreatment,
  today: Day,
  forecast: RidingForecast,
): DueWindow {
  const window = (used: number, from: Day) =>
    dueWindow(
      dueCdf(
        atomsOf((p) => (lifeQuantile(life, p) - used) / lubePerKm),
        forecast,
      ),
      today,
      limitDays === null ? null : from + limitDays,
    );
  return { ...window(lubeKmUsed, since), renewal: window(0, today).weeklyChance };
}
