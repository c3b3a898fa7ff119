import { Injectable } from '@nestjs/common';
import type { Page, Reading as WireReading, ReadingInput, ReadingQuery } from '@halfpitch/contracts';
import { v5, v7 } from 'uuid';
import { ChainChanges } from '../chains/chain-changes';
import { Chain } from '../chains/chain.entity';
import { ChainsService } from '../chains/chains.service';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { pageOf } from '../common/paging';
import { forbidden, notFound, unprocessable } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { Reading } from './reading.entity';
import { mayReachReading, mayRemoveReading, wrongReadingDay } from './readings.policy';

function toReading(reading: Reading): WireReading {
  const { id, chainId, day, method, valuesPct, lowerPct, upperPct, baseline, notes, byName } = reading;
  return {
    id,
    chainId,
    day,
    method,
    values: valuesPct,
    lower: lowerPct,
    upper: upperPct,
    baseline,
    notes,
    by: byName,
  };
}

@Injectable()
export class ReadingsService {
  constructor(
    private readonly db: TenantDb,
    private readonly chains: ChainsService,
    private readonly changes: ChainChanges,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor, { chainId, ...page }: ReadingQuery): Promise<Page<WireReading>> {
    await this.chains.reach(actor, chainId);
    const query = this.db.manager
      .createQueryBuilder(Reading, 'reading')
      .where('reading.chainId = :chainId', { chainId })
      .orderBy('reading.day', 'DESC')
      .addOrderBy('reading.id', 'DESC');
    return pageOf(query, page, toReading);
  }

  /** Keeps a reading; sent again under the same key, the first is kept and answered. */
  async create(actor: Actor, input: ReadingInput, key?: string): Promise<WireReading> {
    const chain = await this.chains.reach(actor, input.chainId);
    const wrong = wrongReadingDay(input.day, chain, this.clock.today(actor.timeZone));
    if (wrong) throw unprocessable('day', wrong);
    const { values, lower, upper, ...rest } = input;
    const { manager } = this.db;
    const id = key ? v5(`${actor.accountId} ${key}`, chain.id) : v7();
    const kept = await manager.findOneBy(Reading, { id });
    if (kept) return toReading(kept);
    const reading = Object.assign(new Reading(), rest, {
      id,
      workshopId: actor.workshopId,
      valuesPct: values,
      lowerPct: lower,
      upperPct: upper,
      byName: actor.name,
      byAccountId: actor.accountId,
    });
    await manager.createQueryBuilder().insert().into(Reading).values(reading).orIgnore().execute();
    await this.changes.changed(chain.id);
    return toReading(reading);
  }

  async remove(actor: Actor, id: string): Promise<void> {
    const { manager } = this.db;
    const reading = await manager.findOneBy(Reading, { id });
    const chain = reading && (await manager.findOneBy(Chain, { id: reading.chainId }));
    if (!reading || !chain || !mayReachReading(actor, chain)) throw notFound('reading');
    if (!mayRemoveReading(actor, reading))
      throw forbidden(`${reading.byName} measured that at the workshop; ask there to remove it.`);
    await manager.delete(Reading, id);
    await this.changes.changed(chain.id);
  }
}
