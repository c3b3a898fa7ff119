import { Injectable } from '@nestjs/common';
import type { Surface, TreatmentKind, Usage, Weather } from '@halfpitch/contracts';
import { dayOf, equivalentKm, Factors } from '@halfpitch/estimation';
import { ChainsService } from '../chains/chains.service';
import type { Actor } from '../common/actor';
import { TenantDb } from '../database/tenant-db';
import { Treatment } from '../treatments/treatment.entity';
import { WorkshopService } from '../workshop/workshop.service';

interface RiddenRow {
  day: string;
  surface: Surface;
  weather: Weather;
  metres: number;
}
type Cycle = Usage['cycles'][number];

/** Adds one row to the cycle's running sums; rows come in order of their days. */
function addTo(cycle: Cycle, { day, metres, surface, weather }: RiddenRow, factors: Factors): void {
  const km = metres / 1000;
  const { lubeKm } = equivalentKm({ day: dayOf(day), km, surface, weather }, factors);
  const last = cycle.points.at(-1);
  if (last?.day === day) {
    last.km += km;
    last.lubeKm += lubeKm;
  } else {
    cycle.points.push({ day, km: (last?.km ?? 0) + km, lubeKm: (last?.lubeKm ?? 0) + lubeKm });
  }
}

/** Splits riding at the treatments; what was ridden on a treatment's day was ridden before it. */
export function usageCycles(
  inServiceOn: string,
  treatments: readonly { id: string; day: string; kind: TreatmentKind }[],
  ridden: readonly RiddenRow[],
  factors: Factors,
): Usage {
  const starts = [{ id: null, day: inServiceOn, kind: null }, ...treatments];
  const cycles = starts.map(({ id, day, kind }, i): Cycle => {
    const to = starts[i + 1]?.day ?? null;
    const cycle: Cycle = { treatmentId: id, kind, from: day, to, points: [] };
    for (const row of ridden) {
      const after = i === 0 || row.day > day;
      if (after && (to === null || row.day <= to)) addTo(cycle, row, factors);
    }
    return cycle;
  });
  return { cycles };
}

@Injectable()
export class UsageService {
  constructor(
    private readonly db: TenantDb,
    private readonly chains: ChainsService,
    private readonly workshops: WorkshopService,
  ) {}

  /** Distance since each treatment, by day. */
  async read(actor: Actor, chainId: string): Promise<Usage> {
    const chain = await this.chains.reach(actor, chainId);
    const { settings } = await this.workshops.current(actor.workshopId);
    const treatments = await this.db.manager.find(Treatment, {
      where: { chainId },
      order: { day: 'ASC', id: 'ASC' },
    });
    const ridden = await this.db.manager.query<RiddenRow[]>(
      `select day::text, surface, weather, sum(distance_m)::int as metres from ride
        where chain_id = $1 group by day, surface, weather order by day`,
      [chainId],
    );
    return usageCycles(chain.inServiceOn, treatments, ridden, settings.factors);
  }
}
