import { Injectable, Logger } from '@nestjs/common';
import { defaultFleetModel, estimateChain } from '@halfpitch/estimation';
import type { FleetModel } from '@halfpitch/estimation';
import { setImmediate } from 'node:timers/promises';
import { v7 } from 'uuid';
import { Clock } from '../common/clock';
import { Listeners } from '../common/listeners';
import { TenantDb } from '../database/tenant-db';
import type { Workshop } from '../workshop/workshop.entity';
import { WorkshopService } from '../workshop/workshop.service';
import { ChainHistories, LoadedChain } from './chain-histories';
import { toDetail } from './estimate-detail';
import type { Estimate } from './estimate.entity';

export interface Estimated {
  workshop: Workshop;
  /** Today in the workshop's time zone. */
  today: string;
  /** Every chain that was asked for, retired ones among them. */
  chainIds: string[];
  /** The new estimates, of those in service. */
  estimates: Estimate[];
}

/** What the workshop's chains have taught, with the factors that its owner set. */
export const modelOf = ({ fleetModel, settings }: Pick<Workshop, 'fleetModel' | 'settings'>): FleetModel => ({
  ...(fleetModel ?? defaultFleetModel()),
  factors: settings.factors,
});

/** Makes and keeps estimates, any number of chains at a time, in the transaction under way. */
@Injectable()
export class Estimator {
  private readonly logger = new Logger(Estimator.name);
  /** Told what was estimated, in its transaction. */
  readonly onEstimated = new Listeners<Estimated>();

  constructor(
    private readonly db: TenantDb,
    private readonly workshops: WorkshopService,
    private readonly histories: ChainHistories,
    private readonly clock: Clock,
  ) {}

  async estimate(workshopId: string, chainIds: string[]): Promise<Estimate[]> {
    const workshop = await this.workshops.current(workshopId);
    const today = this.clock.today(workshop.timeZone);
    const loaded = await this.histories.load(chainIds, today, workshop.settings);
    const fleet = modelOf(workshop);
    const estimates: Estimate[] = [];
    for (const chain of loaded) {
      if (!chain.row.retired) estimates.push(...this.estimateOne(chain, fleet, today));
      await setImmediate();
    }
    if (estimates.length > 0) await this.keep(estimates, today);
    await this.onEstimated.tell({ workshop, today, chainIds, estimates });
    return estimates;
  }

  /** One chain whose record cannot be must not keep the others waiting: it is logged and left as it was. */
  private estimateOne({ row, history }: LoadedChain, fleet: FleetModel, today: string): Estimate[] {
    try {
      const detail = toDetail(estimateChain(history, fleet));
      return [
        {
          id: v7(),
          workshopId: row.workshopId,
          chainId: row.id,
          madeOn: today,
          madeAt: this.clock.now(),
          modelVersion: fleet.version,
          shareUsed: detail.shareUsed,
          lubricationP50: detail.lubrication?.p50 ?? null,
          replacementP50: detail.replacement.p50,
          detail,
        },
      ];
    } catch (error) {
      this.logger.error(`Chain ${row.id} could not be estimated: ${(error as Error).message}`);
      return [];
    }
  }

  /** The last of a day replaces those before it; of earlier days the window stays, and the rest goes. */
  private async keep(estimates: Estimate[], today: string): Promise<void> {
    await this.db.manager.query(
      `insert into estimate (id, workshop_id, chain_id, made_on, made_at, model_version, share_used,
                             lubrication_p50, replacement_p50, detail)
       select "id", "workshopId", "chainId", "madeOn", "madeAt", "modelVersion", "shareUsed",
              "lubricationP50", "replacementP50", detail
         from jsonb_to_recordset($1::jsonb) as made (
           "id" uuid, "workshopId" uuid, "chainId" uuid, "madeOn" date, "madeAt" timestamptz, "modelVersion" text,
           "shareUsed" real, "lubricationP50" date, "replacementP50" date, detail jsonb)
       on conflict (chain_id, made_on) do update set
         made_at = excluded.made_at, model_version = excluded.model_version, share_used = excluded.share_used,
         lubrication_p50 = excluded.lubrication_p50, replacement_p50 = excluded.replacement_p50,
         detail = excluded.detail`,
      [JSON.stringify(estimates)],
    );
    await this.db.manager.query(
      `update estimate set detail = detail - '{elongation,weekly,alerts,kmPerWeek,narrows}'::text[]
        where chain_id = any($1) and made_on < $2 and made_on >= $2::date - 31 and detail ? 'elongation'`,
      [estimates.map(({ chainId }) => chainId), today],
    );
  }
}
