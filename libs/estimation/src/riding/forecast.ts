import { Band, Day, LEVELS, PlannedRiding, RidingForecast, RidingModel } from '../types';
import { dailyLog } from './daily-log';
import { defaultRidingModel } from './default-model';
import { HORIZON_DAYS, LearnedRiding } from './model';
import { NODES_KM, quantileTable } from './quantile-table';
import { isQuiet } from './quiet';

/** A quiet log says less of what comes: its windows are this much wider, on the log scale. */
const QUIET_WIDER = 1.5;

/**
 * The riding ahead of one bike: for any distance the days it takes, as quantiles learned from how other riders' logs
 * went on (see LearnedRiding). Rides after `today` are left out; no rides at all gives an ordinary rider's wide answer.
 */
export function forecastRiding(
  rides: readonly { day: Day; km: number }[],
  today: Day,
  model: RidingModel,
  planned: readonly PlannedRiding[],
): RidingForecast {
  const learned = isLearned(model) ? model : defaultRidingModel;
  const log = dailyLog(rides, today);
  const quiet = isQuiet(log);
  const table = quantileTable(log, learned, quiet ? QUIET_WIDER : 1);
  const daysToReach = (km: number) =>
    LEVELS.map((_, l) => withPlans(planned, today, km, (rest) => readTable(table, l, rest)));
  return { daysToReach, kmPerWeek: kmPerWeek(table), quiet };
}

const isLearned = (model: RidingModel): model is LearnedRiding =>
  model.version === defaultRidingModel.version && Array.isArray(model.location);

/** Days at level `l` until `km` are ridden, read between the nodes and in proportion beyond them. */
function readTable(table: readonly number[][], l: number, km: number): number {
  if (km <= 0) return 0;
  const last = NODES_KM.length - 1;
  if (km >= NODES_KM[last]!) return Math.min(table[last]![l]! * (km / NODES_KM[last]!), HORIZON_DAYS);
  if (km <= NODES_KM[0]) return Math.max(table[0]![l]! * (km / NODES_KM[0]), 1);
  let i = 1;
  while (NODES_KM[i]! < km) i++;
  const share = Math.log(km / NODES_KM[i - 1]!) / Math.log(NODES_KM[i]! / NODES_KM[i - 1]!);
  const days = table[i - 1]![l]! ** (1 - share) * table[i]![l]! ** share;
  return Math.min(days, HORIZON_DAYS);
}

/** The first day by which ordinary riding and what is planned together reach `km`. */
function withPlans(
  planned: readonly PlannedRiding[],
  today: Day,
  km: number,
  days: (km: number) => number,
): number {
  if (planned.length === 0) return days(km);
  const plannedBy = (d: number) =>
    planned.reduce((sum, plan) => {
      const from = Math.max(plan.from, today + 1);
      const length = plan.to - plan.from + 1;
      return sum + (plan.km / length) * Math.max(Math.min(today + d, plan.to) - from + 1, 0);
    }, 0);
  let low = 0;
  let high = Math.ceil(days(km));
  while (low < high) {
    const middle = (low + high) >> 1;
    if (days(km - plannedBy(middle)) <= middle) high = middle;
    else low = middle + 1;
  }
  return low;
}

/** Km a week over four weeks: the distances that take 28 days at the levels 0.9, 0.5 and 0.1. */
function kmPerWeek(table: readonly number[][]): Band {
  const within28 = (l: number) => {
    let low = 0;
    let high = 4000;
    while (high - low > 1) {
      const middle = (low + high) / 2;
      if (readTable(table, l, middle) <= 28) low = middle;
      else high = middle;
    }
    return low / 4;
  };
  const level = (p: number) => LEVELS.indexOf(p as (typeof LEVELS)[number]);
  return { p10: within28(level(0.9)), p50: within28(level(0.5)), p90: within28(level(0.1)) };
}
