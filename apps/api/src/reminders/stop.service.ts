import { Injectable } from '@nestjs/common';
import type { StopView } from '@halfpitch/contracts';
import { notFound } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { Rider } from '../riders/rider.entity';
import { Workshop } from '../workshop/workshop.entity';

/** Stops a rider's letters by the secret link in each of them; no sign-in, no questions. */
@Injectable()
export class StopService {
  constructor(private readonly db: TenantDb) {}

  async view(token: string): Promise<StopView> {
    const { rider, workshop } = await this.open(token);
    return { workshopName: workshop.name, email: rider.email, remindersOn: rider.remindersOn };
  }

  async set(token: string, remindersOn: boolean): Promise<StopView> {
    const { rider } = await this.open(token);
    await this.db.manager.update(Rider, rider.id, { remindersOn });
    return this.view(token);
  }

  /** Enters the workshop the link belongs to. */
  private async open(token: string): Promise<{ rider: Rider; workshop: Workshop }> {
    const [found] = await this.db.manager.query<{ rider_id: string; workshop_id: string }[]>(
      'select * from stop_token_rider($1)',
      [token],
    );
    if (!found) throw notFound('link');
    await this.db.enter({ workshopId: found.workshop_id });
    const rider = await this.db.manager.findOneByOrFail(Rider, { id: found.rider_id });
    const workshop = await this.db.manager.findOneByOrFail(Workshop, { id: found.workshop_id });
    return { rider, workshop };
  }
}
