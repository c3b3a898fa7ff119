import type { Horizon, TreatmentKind } from '@halfpitch/contracts';
import type { EntityManager } from 'typeorm';

/** A window told before something was looked at at the bench, and what was seen. */
export interface ToldRow {
  horizon: Horizon;
  chainId: string;
  label: string;
  riderName: string;
  kind: TreatmentKind | 'replacement';
  toldOn: string;
  p10: string | null;
  p50: string | null;
  p90: string | null;
  day: string;
  seen: 'before' | 'then' | 'after';
}

/** Bounds the work: the newest so many looks are judged. */
const MOST = 5000;

/**
 * Every treatment of the last year judges the one before it by the arrival condition, and every chain retired as worn
 * was due by then. Of each the windows told right after the treatment (within a week), two weeks and one week before.
 */
const TOLD = `
  with treated as (
    select chain_id, day, arrival,
           lag(day) over (partition by chain_id order by day, id) as since,
           lag(kind) over (partition by chain_id order by day, id) as kind
    from treatment),
  looked as (
    select chain_id, day, since, kind, 'lubrication' as about,
           case arrival when 'dry' then 'before' when 'turning' then 'then' else 'after' end as seen
    from treated where since < day and arrival <> 'not-seen'
    union all
    select id, retired_on, in_service_on, 'replacement', 'replacement', 'before'
    from chain where retired_because = 'worn' and in_service_on < retired_on),
  newest as (
    select * from looked where day > $1::date - 365 order by day desc, chain_id limit ${MOST})
  select told.horizon, newest.chain_id as "chainId", chain.label, rider.name as "riderName", newest.kind,
         told.made_on::text as "toldOn", newest.day::text, newest.seen,
         told.detail -> about ->> 'p10' as p10, told.detail -> about ->> 'p50' as p50,
         told.detail -> about ->> 'p90' as p90
  from newest
  join chain on chain.id = newest.chain_id
  join rider on rider.id = chain.rider_id
  cross join lateral (
    (select 'at-treatment' as horizon, made_on, detail from estimate
      where chain_id = newest.chain_id and made_on >= since and made_on <= since + 7 and made_on < newest.day
      order by made_on limit 1)
    union all
    (select 'two-weeks', made_on, detail from estimate
      where chain_id = newest.chain_id and made_on >= since and made_on <= newest.day - 14
      order by made_on desc limit 1)
    union all
    (select 'one-week', made_on, detail from estimate
      where chain_id = newest.chain_id and made_on >= since and made_on <= newest.day - 7
      order by made_on desc limit 1)) told
  where jsonb_typeof(told.detail -> about) = 'object'
    and told.detail -> about ->> 'decidedBy' is distinct from 'calendar'
  order by newest.day desc, newest.chain_id`;

/**
 * Windows told and what was seen, the newest looks first. A chain in the box had no window, and one that the calendar
 * decided says nothing of how long the treatment lasts.
 */
export function toldRows(manager: EntityManager, today: string): Promise<ToldRow[]> {
  return manager.query<ToldRow[]>(TOLD, [today]);
}
