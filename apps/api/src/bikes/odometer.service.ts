import { Injectable } from '@nestjs/common';
import type { OdometerInput, OdometerReading as WireReading, Page, PageQuery } from '@halfpitch/contracts';
import { LessThan, MoreThan } from 'typeorm';
import type { Actor } from '../common/actor';
import { refuseFuture } from '../common/calendar';
import { Clock } from '../common/clock';
import { pageOf } from '../common/paging';
import { notFound, unprocessable } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { BikesService } from './bikes.service';
import { OdometerReading } from './odometer-reading.entity';

const toReading = ({ id, bikeId, day, odometerM }: OdometerReading): WireReading => ({
  id,
  bikeId,
  day,
  odometerM,
});

const km = (metres: number) => `${(metres / 1000).toLocaleString('en-GB', { maximumFractionDigits: 1 })} km`;

/** What a bike's odometer showed, day by day: it never runs backwards. */
@Injectable()
export class OdometerService {
  constructor(
    private readonly db: TenantDb,
    private readonly bikes: BikesService,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor, bikeId: string, page: PageQuery): Promise<Page<WireReading>> {
    await this.bikes.reach(actor, bikeId);
    const query = this.db.manager
      .createQueryBuilder(OdometerReading, 'reading')
      .where('reading.bikeId = :bikeId', { bikeId })
      .orderBy('reading.day', 'DESC');
    return pageOf(query, page, toReading);
  }

  /** Keeps what it showed; a second figure for the same day replaces the first. */
  async record(actor: Actor, bikeId: string, { day, odometerM }: OdometerInput): Promise<WireReading> {
    await this.bikes.reach(actor, bikeId);
    refuseFuture(day, this.clock.today(actor.timeZone));
    await this.refuseBackwards(bikeId, day, odometerM);
    const { manager } = this.db;
    const present = await manager.findOneBy(OdometerReading, { bikeId, day });
    const reading = Object.assign(present ?? new OdometerReading(), {
      workshopId: actor.workshopId,
      bikeId,
      day,
      odometerM,
    });
    await manager.save(OdometerReading, reading);
    await this.bikes.onChanged.tell(bikeId);
    return toReading(reading);
  }

  async remove(actor: Actor, bikeId: string, id: string): Promise<void> {
    await this.bikes.reach(actor, bikeId);
    const { affected } = await this.db.manager.delete(OdometerReading, { id, bikeId });
    if (!affected) throw notFound('odometer reading');
    await this.bikes.onChanged.tell(bikeId);
  }

  private async refuseBackwards(bikeId: string, day: string, odometerM: number): Promise<void> {
    const { manager } = this.db;
    const before = await manager.findOne(OdometerReading, {
      where: { bikeId, day: LessThan(day) },
      order: { day: 'DESC' },
    });
    if (before && before.odometerM > odometerM)
      throw unprocessable(
        'odometerM',
        `An odometer does not run backwards: on ${before.day} it showed ${km(before.odometerM)}.`,
      );
    const after = await manager.findOne(OdometerReading, {
      where: { bikeId, day: MoreThan(day) },
      order: { day: 'ASC' },
    });
    if (after && after.odometerM < odometerM)
      throw unprocessable(
        'odometerM',
        `An odometer does not run backwards: on ${after.day} it showed only ${km(after.odometerM)}.`,
      );
  }
}
