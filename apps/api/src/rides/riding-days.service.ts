import { Injectable } from '@nestjs/common';
import type { RidingDay, RidingDayQuery, RidingDays, Surface, Weather } from '@halfpitch/contracts';
import { rideFactor } from '@halfpitch/estimation';
import type { Factors } from '@halfpitch/estimation';
import { BikesService } from '../bikes/bikes.service';
import { ChainsService } from '../chains/chains.service';
import type { Actor } from '../common/actor';
import { dayNumber, yearsBefore } from '../common/calendar';
import { Clock } from '../common/clock';
import { unprocessable } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { WorkshopService } from '../workshop/workshop.service';

const MAX_YEARS = 3;

interface RiddenRow {
  day: string;
  surface: Surface;
  weather: Weather;
  distanceM: number;
}

/** Adds one row to its day; rows come in order of their days. */
function addTo(days: RidingDay[], row: RiddenRow, factors: Factors): RidingDay[] {
  const { day, distanceM, surface, weather } = row;
  const { lube, wear } = rideFactor({ day: dayNumber(day), surface, weather }, factors);
  if (days.at(-1)?.day !== day) days.push({ day, distanceM: 0, lubeM: 0, wearM: 0 });
  const sum = days.at(-1)!;
  sum.distanceM += distanceM;
  sum.lubeM += Math.round(distanceM * lube);
  sum.wearM += Math.round(distanceM * wear);
  return days;
}

@Injectable()
export class RidingDaysService {
  constructor(
    private readonly db: TenantDb,
    private readonly bikes: BikesService,
    private readonly chains: ChainsService,
    private readonly workshop: WorkshopService,
    private readonly clock: Clock,
  ) {}

  /** What was ridden day by day on a bike or a chain, the last three years unless told otherwise. */
  async read(actor: Actor, query: RidingDayQuery): Promise<RidingDays> {
    const to = query.to ?? this.clock.today(actor.timeZone);
    const from = query.from ?? yearsBefore(to, MAX_YEARS);
    if (from < yearsBefore(to, MAX_YEARS))
      throw unprocessable('from', `At most ${MAX_YEARS} years at a time: choose a later first day.`);
    const rows = await this.ridden(await this.whose(actor, query), from, to);
    const { settings } = await this.workshop.current(actor.workshopId);
    return {
      from,
      to,
      days: rows.reduce<RidingDay[]>((days, row) => addTo(days, row, settings.factors), []),
    };
  }

  private async whose(actor: Actor, { bikeId, chainId }: RidingDayQuery): Promise<[string, string]> {
    if (chainId !== undefined) return ['chain_id', (await this.chains.reach(actor, chainId)).id];
    return ['bike_id', (await this.bikes.reach(actor, bikeId!)).id];
  }

  private ridden([column, id]: [string, string], from: string, to: string): Promise<RiddenRow[]> {
    return this.db.manager.query(
      `select day::text, surface, weather, sum(distance_m)::int as "distanceM" from ride
        where ${column} = $1 and day between $2 and $3 group by day, surface, weather order by day`,
      [id, from, to],
    );
  }
}
