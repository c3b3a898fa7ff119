import { Injectable } from '@nestjs/common';
import type {
  ChainEstimate,
  EstimationModel,
  Page,
  PastEstimate,
  PastEstimateQuery,
} from '@halfpitch/contracts';
import { ChainsService } from '../chains/chains.service';
import type { Actor } from '../common/actor';
import { pageOf } from '../common/paging';
import { ProblemException } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { WorkshopService } from '../workshop/workshop.service';
import { Estimate } from './estimate.entity';
import { Estimator, modelOf } from './estimator.service';
import { toldModel } from './told-model';

function toEstimate({ id, chainId, madeAt, detail }: Estimate): ChainEstimate {
  const { weekly, ...told } = detail;
  return { ...told, id, chainId, madeAt: new Date(madeAt).toISOString() };
}

function toPast({ id, madeAt, detail }: Estimate): PastEstimate {
  const { shareUsed, lubrication, replacement } = detail;
  return { id, madeAt: madeAt.toISOString(), shareUsed, lubrication, replacement };
}

@Injectable()
export class EstimatesService {
  constructor(
    private readonly db: TenantDb,
    private readonly chains: ChainsService,
    private readonly workshops: WorkshopService,
    private readonly estimator: Estimator,
  ) {}

  /** The newest estimate; made on the spot where there is none yet. */
  async current(actor: Actor, chainId: string): Promise<ChainEstimate> {
    const chain = await this.chains.reach(actor, chainId);
    const kept = await this.newest(chainId);
    if (kept) return toEstimate(kept);
    const [made] = await this.estimator.estimate(actor.workshopId, [chainId]);
    if (made) return toEstimate(made);
    const detail = chain.retiredOn
      ? `It was retired on ${chain.retiredOn}, before anything was estimated.`
      : 'What is recorded of this chain cannot be right: check its rides and readings.';
    throw new ProblemException(409, 'No estimate', detail);
  }

  /** What was believed when, newest first. */
  async past(actor: Actor, chainId: string, page: PastEstimateQuery): Promise<Page<PastEstimate>> {
    await this.chains.reach(actor, chainId);
    const query = this.db.manager
      .createQueryBuilder(Estimate, 'estimate')
      .where('estimate.chainId = :chainId', { chainId })
      .orderBy('estimate.madeOn', 'DESC');
    return pageOf(query, page, toPast);
  }

  /** What estimates are worked out with: what was learned, beside what it started from. */
  async model({ workshopId }: Actor): Promise<EstimationModel> {
    return toldModel(modelOf(await this.workshops.current(workshopId)));
  }

  /** The newest estimate that is kept. */
  newest(chainId: string): Promise<Estimate | null> {
    return this.db.manager.findOne(Estimate, { where: { chainId }, order: { madeOn: 'DESC' } });
  }
}
