import type { Chain, Regime, RetiredReason } from '@halfpitch/contracts';
import { defaultWearLimitPct } from '@halfpitch/estimation';

/** A chain with its rider, the bike it is on and its newest estimate, from one statement. */
export const CHAIN_COLUMNS = `
  chain.id, chain.rider_id as "riderId", rider.name as "riderName",
  rider.reminders_on as "remindersOn", chain.label, chain.speeds, chain.regime,
  chain.wear_limit_pct as "wearLimitPct", chain.in_service_on::text as "inServiceOn",
  chain.retired_on::text as "retiredOn", chain.retired_because as "retiredBecause",
  bike.id as "bikeId", bike.name as "bikeName",
  estimate.made_at as "madeAt", estimate.detail`;

export const CHAIN_FROM = `chain
  join rider on rider.id = chain.rider_id
  left join fitting on fitting.chain_id = chain.id and fitting.to_day is null
  left join bike on bike.id = fitting.bike_id
  left join lateral (
    select made_at, detail, lubrication_p50, replacement_p50 from estimate
    where estimate.chain_id = chain.id order by made_on desc limit 1) estimate on true`;

/** 'soonest': by the most likely day on which it falls due for either. */
export const CHAIN_ORDER = {
  label: 'rider.name, rider.id, chain.label, chain.id',
  soonest: 'least(estimate.lubrication_p50, estimate.replacement_p50) nulls last, chain.label, chain.id',
} as const;

export interface ChainRow {
  id: string;
  riderId: string;
  riderName: string;
  remindersOn: boolean;
  label: string;
  speeds: number;
  regime: Regime;
  wearLimitPct: number | null;
  inServiceOn: string;
  retiredOn: string | null;
  retiredBecause: RetiredReason | null;
  bikeId: string | null;
  bikeName: string | null;
  madeAt: Date | null;
  detail: Omit<NonNullable<Chain['state']>, 'madeAt'> | null;
}

export function toChain({ madeAt, detail, ...row }: ChainRow): Chain {
  return {
    ...row,
    limitPct: row.wearLimitPct ?? defaultWearLimitPct(row.speeds),
    state: detail && madeAt && { ...detail, madeAt: madeAt.toISOString() },
  };
}
