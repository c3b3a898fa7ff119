import { Injectable } from '@nestjs/common';
import type { Page, Treatment as WireTreatment, TreatmentInput, TreatmentQuery } from '@halfpitch/contracts';
import { ChainChanges } from '../chains/chain-changes';
import { ChainsService } from '../chains/chains.service';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { Listeners } from '../common/listeners';
import { pageOf } from '../common/paging';
import { notFound, unprocessable } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { ReadingsService } from '../readings/readings.service';
import { Treatment } from './treatment.entity';
import { wrongTreatmentDay } from './treatments.policy';

const toTreatment = (treatment: Treatment): WireTreatment => {
  const { id, chainId, day, kind, arrival, notes, byName } = treatment;
  return { id, chainId, day, kind, arrival, notes, by: byName };
};

@Injectable()
export class TreatmentsService {
  /** Told each treatment recorded, in its transaction: it closes what was open about the one before. */
  readonly onRecorded = new Listeners<WireTreatment>();

  constructor(
    private readonly db: TenantDb,
    private readonly chains: ChainsService,
    private readonly readings: ReadingsService,
    private readonly changes: ChainChanges,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor, { chainId, ...page }: TreatmentQuery): Promise<Page<WireTreatment>> {
    await this.chains.reach(actor, chainId);
    const query = this.db.manager
      .createQueryBuilder(Treatment, 'treatment')
      .where('treatment.chainId = :chainId', { chainId })
      .orderBy('treatment.day', 'DESC')
      .addOrderBy('treatment.id', 'DESC');
    return pageOf(query, page, toTreatment);
  }

  /** Records what was done, and what was measured with it, both or neither. */
  async create(actor: Actor, { reading, ...input }: TreatmentInput): Promise<WireTreatment> {
    const chain = await this.chains.reach(actor, input.chainId);
    const wrong = wrongTreatmentDay(input.day, chain, this.clock.today(actor.timeZone));
    if (wrong) throw unprocessable('day', wrong);
    const treatment = Object.assign(new Treatment(), input, {
      workshopId: actor.workshopId,
      byName: actor.name,
    });
    await this.db.manager.insert(Treatment, treatment);
    const { chainId, day } = input;
    if (reading) await this.readings.create(actor, { ...reading, chainId, day, baseline: false, notes: '' });
    const recorded = toTreatment(treatment);
    await this.onRecorded.tell(recorded);
    await this.changes.changed(chainId);
    return recorded;
  }

  async remove(actor: Actor, id: string): Promise<void> {
    const treatment = await this.db.manager.findOneBy(Treatment, { id });
    if (!treatment) throw notFound('treatment');
    await this.chains.reach(actor, treatment.chainId);
    await this.db.manager.delete(Treatment, id);
    await this.changes.changed(treatment.chainId);
  }
}
