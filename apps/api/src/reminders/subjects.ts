import type { Regime } from '@halfpitch/contracts';
import type { EntityManager } from 'typeorm';

/** Whom a reminder of a chain is for, and which cycle of its life it is in. */
export interface Subject {
  chainId: string;
  label: string;
  regime: Regime;
  retired: boolean;
  bikeName: string | null;
  riderId: string;
  riderName: string;
  email: string;
  stopToken: string;
  remindersOn: boolean;
  lastTreatmentId: string | null;
  inServiceOn: string;
}

/** The treatment whose life runs now; `chain` is any alias of the table. */
const LAST_TREATMENT = `(
  select treatment.id from treatment where treatment.chain_id = chain.id
  order by treatment.day desc, treatment.id desc limit 1)`;

export function subjectsOf(manager: EntityManager, chainIds: string[]): Promise<Subject[]> {
  return manager.query(
    `select chain.id as "chainId", chain.label, chain.regime, chain.retired_on is not null as retired,
            bike.name as "bikeName", rider.id as "riderId", rider.name as "riderName", rider.email,
            rider.stop_token as "stopToken", rider.reminders_on as "remindersOn",
            ${LAST_TREATMENT} as "lastTreatmentId", chain.in_service_on::text as "inServiceOn"
       from chain join rider on rider.id = chain.rider_id
       left join fitting on fitting.chain_id = chain.id and fitting.to_day is null
       left join bike on bike.id = fitting.bike_id
      where chain.id = any($1) order by chain.id`,
    [chainIds],
  );
}

/**
 * Closes what is open about chains that were retired, and about treatments that have been redone since. A letter that
 * has not left yet is taken back.
 */
export async function closeOutlived(manager: EntityManager, chainIds: string[], now: Date): Promise<void> {
  await manager.query(
    `with outlived as (
       update reminder set closed_at = $2 from chain
        where chain.id = reminder.chain_id and chain.id = any($1) and closed_at is null
          and (chain.retired_on is not null
               or kind = 'lubrication'
                  and cycle <> coalesce(${LAST_TREATMENT}::text, chain.in_service_on::text))
       returning mail_id)
     delete from mail using outlived where mail.id = outlived.mail_id and mail.state = 'waiting'`,
    [chainIds, now],
  );
}
