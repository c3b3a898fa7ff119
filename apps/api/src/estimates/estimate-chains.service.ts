import { Injectable } from '@nestjs/common';
import { defaultFleetModel, estimateChain, FleetModel } from '@halfpitch/estimation';
import { v7 } from 'uuid';
import { Clock } from '../common/clock';
import { Listeners } from '../common/listeners';
import { TenantDb } from '../database/tenant-db';
import { Workshop } from '../workshop/workshop.entity';
import type { EstimateDetail } from './estimate.entity';
import { HistoryLoader } from './history-loader';
import { toDetail } from './to-detail';

/** An estimate just made, for whoever acts on it in the same transaction. */
export interface FreshEstimate {
  workshop: Workshop;
  chainId: string;
  riderId: string;
  madeOn: string;
  detail: EstimateDetail;
}

/** The workshop's model: what its own riders and chains taught, under its own factors. */
export function modelOf({ fleetModel, settings }: Pick<Workshop, 'fleetModel' | 'settings'>): FleetModel {
  return { ...(fleetModel ?? defaultFleetModel()), factors: settings.factors };
}

/** Makes and keeps estimates: of one chain, or of a batch of them with the same few queries. */
@Injectable()
export class EstimateChainsService {
  /** Told all estimates of a batch, in its transaction. */
  readonly onEstimated = new Listeners<FreshEstimate[]>();

  constructor(
    private readonly db: TenantDb,
    private readonly loader: HistoryLoader,
    private readonly clock: Clock,
  ) {}

  async estimate(workshop: Workshop, chainIds: readonly string[]): Promise<void> {
    const now = this.clock.now();
    const madeOn = this.clock.today(workshop.timeZone);
    const model = modelOf(workshop);
    const loaded = await this.loader.load(chainIds, madeOn, workshop.settings);
    const fresh = loaded.map(({ chainId, riderId, history }) => ({
      workshop,
      chainId,
      riderId,
      madeOn,
      detail: toDetail(estimateChain(history, model)),
    }));
    await this.keep(fresh, now, model.version);
    await this.onEstimated.tell(fresh);
  }

  /** The last estimate of a day replaces that day's earlier ones. */
  private async keep(fresh: FreshEstimate[], madeAt: Date, version: string): Promise<void> {
    await this.db.manager.query(
      `insert into estimate (id, workshop_id, chain_id, made_on, made_at, model_version, share_used, lubrication_p50,
                             replacement_p50, detail)
       select id, current_workshop(), chain_id, $3, $4, $5, (detail ->> 'shareUsed')::real,
              (detail -> 'lubrication' ->> 'p50')::date, (detail -> 'replacement' ->> 'p50')::date, detail
       from unnest($1::uuid[], $2::uuid[], $6::jsonb[]) as made (id, chain_id, detail)
       on conflict (chain_id, made_on) do update set
         made_at = excluded.made_at, model_version = excluded.model_version, share_used = excluded.share_used,
         lubrication_p50 = excluded.lubrication_p50, replacement_p50 = excluded.replacement_p50,
         detail = excluded.detail`,
      [
        fresh.map(() => v7()),
        fresh.map(({ chainId }) => chainId),
        fresh[0]?.madeOn ?? null,
        madeAt,
        version,
        fresh.map(({ detail }) => JSON.stringify(detail)),
      ],
    );
  }
}
