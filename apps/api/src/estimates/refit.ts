import { dayOf, defaultFleetModel, fitElongationPriors, fitLife } from '@halfpitch/estimation';
import type { ChainLesson, FleetModel } from '@halfpitch/estimation';

const DAYS_BETWEEN = 7;
const VERSION = /^learned-(\d{4}-\d{2}-\d{2})$/;

/** Whether a workshop's model is missing or a week old. */
export function refitIsDue(model: FleetModel | null, today: string): boolean {
  const learnedOn = VERSION.exec(model?.version ?? '')?.[1];
  return learnedOn === undefined || dayOf(today) - dayOf(learnedOn) >= DAYS_BETWEEN;
}

/** More riders teach no more, and the sums would hold up the process that makes them. */
const MOST_RIDERS = 300;

/** At most so many riders, evenly over all of them. */
function someOf<T>(riders: readonly T[]): T[] {
  const step = Math.max(riders.length / MOST_RIDERS, 1);
  return riders.filter((_, i) => Math.floor(i / step) !== Math.floor((i - 1) / step));
}

/** What each rider's chains teach, beginning each time from what every workshop starts from. */
export function refit(
  model: FleetModel | null,
  lessons: ReadonlyMap<string, readonly ChainLesson[]>,
  today: string,
): FleetModel {
  const start = defaultFleetModel();
  const riders = someOf([...lessons.values()]);
  const measured = riders.flat().filter(({ readings }) => readings.length > 0);
  return {
    ...(model ?? start),
    version: `learned-${today}`,
    life: fitLife(
      riders.map((chains) => chains.flatMap(({ lives }) => lives)),
      start.life,
    ),
    elongation: fitElongationPriors(measured, start.elongation),
  };
}
