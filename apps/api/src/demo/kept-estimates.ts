import { dayOf, defaultFleetModel, estimateChain, PreviousEstimate } from '@halfpitch/estimation';
import { plusDays } from '../common/calendar';
import type { Estimate } from '../estimates/estimate.entity';
import { toDetail } from '../estimates/estimate-detail';
import type { Workshop } from '../workshop/workshop.entity';
import { historyAsOf } from './past-histories';
import { Random } from './random';
import type { Household } from './records';

const dayOrNull = (day: string | null) => (day === null ? null : dayOf(day));

/** What would have been said of each chain so many weeks ago, the oldest first, by the library itself, knowing only what was known then. */
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
    for (const week of weeksAgo) {
      const madeOn = plusDays(today, -7 * week);
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
