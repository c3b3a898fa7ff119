import { Injectable } from '@nestjs/common';
import type { StopView } from '@halfpitch/contracts';
import { notFound } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { Rider } from '../riders/rider.entity';
import { WorkshopService } from '../workshop/workshop.service';

/** Stops the letters of one rider and starts them again, for whoever holds the link from a letter. */
@Injectable()
export class StopService {
  constructor(
    private readonly db: TenantDb,
    private readonly workshops: WorkshopService,
  ) {}

  async read(token: string): Promise<StopView> {
    const { email, remindersOn, workshopId } = await this.open(token);
    const { name } = await this.workshops.current(workshopId);
    return { workshopName: name, email, remindersOn };
  }

  async change(token: string, on: boolean): Promise<StopView> {
    const { id } = await this.open(token);
    await this.db.manager.update(Rider, id, { remindersOn: on });
    return this.read(token);
  }

  private async open(token: string): Promise<Rider> {
    const [found] = await this.db.manager.query<{ rider_id: string; workshop_id: string }[]>(
      'select * from stop_token_rider($1)',
      [token],
    );
    if (!found) throw notFound('link');
    await this.db.enter({ workshopId: found.workshop_id });
    return this.db.manager.findOneByOrFail(Rider, { id: found.rider_id });
  }
}
