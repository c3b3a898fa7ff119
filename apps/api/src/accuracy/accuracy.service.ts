import { Injectable } from '@nestjs/common';
import type { Accuracy } from '@halfpitch/contracts';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { TenantDb } from '../database/tenant-db';
import { judge } from './judge';
import { toldRows } from './told-rows';

/** Holds the windows that were told against what was found at the bench. */
@Injectable()
export class AccuracyService {
  constructor(
    private readonly db: TenantDb,
    private readonly clock: Clock,
  ) {}

  async read({ timeZone }: Actor): Promise<Accuracy> {
    return judge(await toldRows(this.db.manager, this.clock.today(timeZone)));
  }
}
