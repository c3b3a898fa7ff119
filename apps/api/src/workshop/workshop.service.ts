import { Injectable } from '@nestjs/common';
import type { WorkshopSettings } from '@halfpitch/contracts';
import { TenantDb } from '../database/tenant-db';
import { Workshop } from './workshop.entity';

function toSettings({ name, town, timeZone, currency, settings }: Workshop): WorkshopSettings {
  return { name, town, timeZone, currency, ...settings };
}

@Injectable()
export class WorkshopService {
  constructor(private readonly db: TenantDb) {}

  /** The workshop of the scope under way. */
  current(workshopId: string): Promise<Workshop> {
    return this.db.manager.findOneByOrFail(Workshop, { id: workshopId });
  }

  async read(workshopId: string): Promise<WorkshopSettings> {
    return toSettings(await this.current(workshopId));
  }

  async change(workshopId: string, input: WorkshopSettings): Promise<WorkshopSettings> {
    const { name, town, timeZone, currency, ...settings } = input;
    const workshop = Object.assign(await this.current(workshopId), {
      name,
      town,
      timeZone,
      currency,
      settings,
    });
    return toSettings(await this.db.manager.save(Workshop, workshop));
  }
}
