import { dayOf, defaultFleetModel, estimateChain, PreviousEstimate } from '@halfpitch/estimation';
import { plusDays } from '../common/calendar';
import type { Chain } from '../chains/chain.entity';
import type { Estimate } from '../estimates/estimate.entity';
import { toDetail } from '../estimates/estimate-detail';
import type { Workshop } from '../workshop/workshop.entity';
import { historyAsOf } from './past-histories';
import { Random } from './random';
import type { Household } from './records';

const dayOrNull = (day: string | null) => (day === null ? null : dayOf(day));

/** Looks of the last so many days are judged by the windows told before them. */
const JUDGED_DAYS = 150;

/** The days on which a chain's estimate is kept, oldest first: so many weeks ago, and right after each treatment and two weeks before the next. */
function daysKept(
  { treatments }: Household,
  chain: Chain,
  today: string,
  weeksAgo: readonly number[],
): string[] {
  const days = new Set(weeksAgo.map((weeks) => plusDays(today, -7 * weeks)));
  const own = treatments
    .filter(({ chainId }) => chainId === chain.id)
    .map(({ day }) => day)
    .sort();
  for (const [i, day] of own.entries()) {
    const since = own[i - 1];
    if (since === undefined || day < plusDays(today, -JUDGED_DAYS)) continue;
    if (since < day) days.add(since);
    if (since <= plusDays(day, -14)) days.add(plusDays(day, -14));
  }
  return [...days].sort();
}

/** What would have been said of each chain on past days, by the library itself, knowing only what was known then. */
export function keptEstimates(
  random: Random,
  household: Household,
  { settings }: Workshop,
  today: string,
  weeksAgo: readonly number[],
): Estimate[] {
  const model = { ...defaultFleetModel(), factors: settings.factors };
  const kept: Estimate[] = [];
  for (const chain of household.chains) {
    let previous: PreviousEstimate | undefined;
    for (const madeOn of daysKept(household, chain, today, weeksAgo)) {
      const history = historyAsOf(household, chain, madeOn, settings);
      if (!history) continue;
      const detail = toDetail(estimateChain({ ...history, previous }, model));
      const lubricationP50 = detail.lubrication?.p50 ?? null;
      const replacementP50 = detail.replacement.p50;
      previous = {
        day: history.today,
        lubricationP50: dayOrNull(lubricationP50),
        replacementP50: dayOrNull(replacementP50),
      };
      kept.push({
        id: random.id(history.today),
        workshopId: chain.workshopId,
        chainId: chain.id,
        madeOn,
        madeAt: new Date(`${madeOn}T03:00:00Z`),
        modelVersion: model.version,
        shareUsed: detail.shareUsed,
        lubricationP50,
        replacementP50,
        detail,
      });
    }
  }
  return kept;
}
