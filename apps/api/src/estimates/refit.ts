import { dayOf, defaultFleetModel, fitElongationPriors, fitLife } from '@halfpitch/estimation';
import type { ChainLesson, FleetModel, RidingModel } from '@halfpitch/estimation';
import { someOf } from './some-of';

const DAYS_BETWEEN = 7;
const VERSION = /^learned-(\d{4}-\d{2}-\d{2})$/;

/** The day on which a model was learned; null for the shipped one. */
export const learnedOn = (model: FleetModel | null): string | null =>
  VERSION.exec(model?.version ?? '')?.[1] ?? null;

/** Whether a workshop's model is missing or a week old. */
export function refitIsDue(model: FleetModel | null, today: string): boolean {
  const day = learnedOn(model);
  return day === null || dayOf(today) - dayOf(day) >= DAYS_BETWEEN;
}

/** More riders teach no more, and the sums would hold up the process that makes them. */
const MOST_RIDERS = 300;

/** What each rider's chains teach, beginning each time from what every workshop starts from; `riding` as learned apart. */
export function refit(
  riding: RidingModel,
  lessons: ReadonlyMap<string, readonly ChainLesson[]>,
  today: string,
): FleetModel {
  const start = defaultFleetModel();
  const riders = someOf([...lessons.values()], MOST_RIDERS);
  const measured = riders.flat().filter(({ readings }) => readings.length > 0);
  return {
    ...start,
    riding,
    version: `learned-${today}`,
    life: fitLife(
      riders.map((chains) => chains.flatMap(({ lives }) => lives)),
      start.life,
    ),
    elongation: fitElongationPriors(measured, start.elongation),
  };
}
