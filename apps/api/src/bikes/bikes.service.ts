import { Injectable } from '@nestjs/common';
import type { Bike as WireBike, BikeInput, BikeQuery, NewBike, Page } from '@halfpitch/contracts';
import type { Actor } from '../common/actor';
import { Listeners } from '../common/listeners';
import { notFound } from '../common/problems';
import { Conditions, pageOfSql } from '../common/sql-page';
import { TenantDb } from '../database/tenant-db';
import { ridersInReach } from '../riders/riders.policy';
import { RidersService } from '../riders/riders.service';
import { BIKE_COLUMNS, BIKE_FROM } from './bike-list';
import { Bike } from './bike.entity';
import { mayReachBike } from './bikes.policy';

@Injectable()
export class BikesService {
  /** Told the id of a bike of which something changes that estimates go by, or that is about to be removed. */
  readonly onChanged = new Listeners<string>();

  constructor(
    private readonly db: TenantDb,
    private readonly riders: RidersService,
  ) {}

  list(actor: Actor, { riderId, ...page }: BikeQuery): Promise<Page<WireBike>> {
    const { where, values } = new Conditions().add('bike.rider_id = ?', ridersInReach(actor, riderId));
    const order = 'rider.name, rider.id, bike.name, bike.id';
    return pageOfSql(this.db.manager, { columns: BIKE_COLUMNS, from: BIKE_FROM, where, values, order }, page);
  }

  async read(actor: Actor, id: string): Promise<WireBike> {
    await this.reach(actor, id);
    const [bike] = await this.db.manager.query<WireBike[]>(
      `select ${BIKE_COLUMNS} from ${BIKE_FROM} where bike.id = $1`,
      [id],
    );
    return bike!;
  }

  /** The bike with this id, where who asks may reach it; else there is none. */
  async reach(actor: Actor, id: string): Promise<Bike> {
    const bike = await this.db.manager.findOneBy(Bike, { id });
    if (!bike || !mayReachBike(actor, bike)) throw notFound('bike');
    return bike;
  }

  async create(actor: Actor, input: NewBike): Promise<WireBike> {
    await this.riders.reach(actor, input.riderId);
    const bike = Object.assign(new Bike(), input, { workshopId: actor.workshopId });
    await this.db.manager.insert(Bike, bike);
    return this.read(actor, bike.id);
  }

  async change(actor: Actor, id: string, input: BikeInput): Promise<WireBike> {
    await this.reach(actor, id);
    await this.db.manager.update(Bike, id, input);
    await this.onChanged.tell(id);
    return this.read(actor, id);
  }

  /** Removes the bike with its rides; its chains go into the box. */
  async remove(actor: Actor, id: string): Promise<void> {
    await this.reach(actor, id);
    await this.onChanged.tell(id);
    await this.db.manager.delete(Bike, id);
  }
}
