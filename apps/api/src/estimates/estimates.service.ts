import { Injectable } from '@nestjs/common';
import type { ChainEstimate, Page, PageQuery, PastEstimate } from '@halfpitch/contracts';
import { ChainsService } from '../chains/chains.service';
import type { Actor } from '../common/actor';
import { pageOf } from '../common/paging';
import { TenantDb } from '../database/tenant-db';
import { WorkshopService } from '../workshop/workshop.service';
import { EstimateChainsService } from './estimate-chains.service';
import { Estimate } from './estimate.entity';

function toEstimate({ id, chainId, madeAt, detail }: Estimate): ChainEstimate {
  return { ...detail, id, chainId, madeAt: madeAt.toISOString() };
}

function toPastEstimate(estimate: Estimate): PastEstimate {
  const { id, madeAt, shareUsed, lubrication, replacement } = toEstimate(estimate);
  return { id, madeAt, shareUsed, lubrication, replacement };
}

@Injectable()
export class EstimatesService {
  constructor(
    private readonly db: TenantDb,
    private readonly chains: ChainsService,
    private readonly workshop: WorkshopService,
    private readonly making: EstimateChainsService,
  ) {}

  /** The newest estimate; a chain that has none yet is estimated on the spot. */
  async current(actor: Actor, chainId: string): Promise<ChainEstimate> {
    await this.chains.reach(actor, chainId);
    const kept = await this.newest(chainId);
    if (kept) return toEstimate(kept);
    await this.making.estimate(await this.workshop.current(actor.workshopId), [chainId]);
    return toEstimate((await this.newest(chainId))!);
  }

  /** What was believed when, the newest first. */
  async past(actor: Actor, chainId: string, page: PageQuery): Promise<Page<PastEstimate>> {
    await this.chains.reach(actor, chainId);
    const query = this.db.manager
      .createQueryBuilder(Estimate, 'estimate')
      .where('estimate.chainId = :chainId', { chainId })
      .orderBy('estimate.madeOn', 'DESC');
    return pageOf(query, page, toPastEstimate);
  }

  private newest(chainId: string): Promise<Estimate | null> {
    return this.db.manager.findOne(Estimate, { where: { chainId }, order: { madeOn: 'DESC' } });
  }
}
