import type { Plan, PlanOutlook } from '@halfpitch/contracts';
import { chanceBefore, dayOf, isoDay } from '@halfpitch/estimation';
import type { EstimateDetail } from '../estimates/estimate.entity';

/** A plan with its bike, the chain that is on it and that chain's newest estimate, from one statement. */
export const PLAN_COLUMNS = `
  plan.id, plan.bike_id as "bikeId", bike.name as "bikeName", plan.name, plan.from_day::text as "from",
  plan.to_day::text as "to", plan.distance_m as "distanceM", chain.id as "chainId", chain.label as "chainLabel",
  estimate.made_on::text as "madeOn", estimate.detail`;

export const PLAN_FROM = `planned_riding plan
  join bike on bike.id = plan.bike_id
  left join fitting on fitting.bike_id = bike.id and fitting.to_day is null
  left join chain on chain.id = fitting.chain_id
  left join lateral (
    select made_on, detail from estimate
    where estimate.chain_id = chain.id order by made_on desc limit 1) estimate on true`;

export interface PlanRow extends Omit<Plan, 'outlook'> {
  chainId: string | null;
  chainLabel: string | null;
  madeOn: string | null;
  detail: EstimateDetail | null;
}

/** From this chance on, one who rides far from home had better come in before. */
const WORTH_COMING = 0.2;

/** What the plan does to the chain by its newest estimate; null where that is missing or does not look so far. */
function outlookOf({ from, to, distanceM, ...row }: PlanRow, today: string): PlanOutlook | null {
  const { chainId, chainLabel, madeOn, detail } = row;
  if (!chainId || chainLabel === null || !madeOn || !detail?.lubrication || !detail.weekly?.lubrication)
    return null;
  const made = dayOf(madeOn);
  const begin = dayOf(from);
  const over = dayOf(to) + 1;
  const { lubrication: told, replacement, weekly } = detail;
  if (over - made > 7 * weekly.replacement.length) return null;
  const due = (now: number, chances: readonly number[]) => ({
    before: chanceBefore({ now, weekly: chances }, made, begin),
    byEnd: chanceBefore({ now, weekly: chances }, made, over),
  });
  const lubrication = due(told.chanceNow, weekly.lubrication!);
  const worn = due(replacement.chanceNow, weekly.replacement);
  const isLikely = Math.max(lubrication.byEnd, worn.byEnd) >= WORTH_COMING;
  return {
    chainId,
    chainLabel,
    lubrication,
    replacement: worn,
    treatments: distanceM / 1000 / detail.treatment.life.p50,
    comeInBy: isLikely ? isoDay(Math.max(begin - 1, dayOf(today))) : null,
  };
}

export function toPlan(row: PlanRow, today: string): Plan {
  const { id, bikeId, bikeName, name, from, to, distanceM } = row;
  return { id, bikeId, bikeName, name, from, to, distanceM, outlook: outlookOf(row, today) };
}
