import { isDeepStrictEqual } from 'node:util';
import { Injectable } from '@nestjs/common';
import type { WorkshopSettings } from '@halfpitch/contracts';
import { Listeners } from '../common/listeners';
import { TenantDb } from '../database/tenant-db';
import { Workshop } from './workshop.entity';

function toSettings({ name, town, timeZone, currency, settings }: Workshop): WorkshopSettings {
  return { name, town, timeZone, currency, ...settings };
}

/** Of the settings, what estimates are made from. */
const modelPart = ({
  factors,
  calendarLimitDays,
}: Pick<WorkshopSettings, 'factors' | 'calendarLimitDays'>) => ({
  factors,
  calendarLimitDays,
});

@Injectable()
export class WorkshopService {
  /** Told the workshop, in its transaction, when what every estimate is worked out with was changed. */
  readonly onModelChanged = new Listeners<string>();

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
    const workshop = await this.current(workshopId);
    const modelChanged = !isDeepStrictEqual(modelPart(workshop.settings), modelPart(settings));
    Object.assign(workshop, {
      name,
      town,
      timeZone,
      currency,
      settings,
    });
    await this.db.manager.save(Workshop, workshop);
    if (modelChanged) await this.onModelChanged.tell(workshopId);
    return toSettings(workshop);
  }
}
