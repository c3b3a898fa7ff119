import { Injectable } from '@nestjs/common';
import type { Usage } from '@halfpitch/contracts';
import { dayOf, equivalentKm, isoDay, Ride, Treatment } from '@halfpitch/estimation';
import { ChainsService } from '../chains/chains.service';
import type { Actor } from '../common/actor';
import { TenantDb } from '../database/tenant-db';
import { WorkshopService } from '../workshop/workshop.service';
import { readRecords } from './chain-records';
import { loadRides } from './ride-rows';

type Factors = Parameters<typeof equivalentKm>[1];
type Cycle = Usage['cycles'][number];

/** Distance since each treatment, for the chart of how the present one is being used up. */
@Injectable()
export class UsageService {
  constructor(
    private readonly db: TenantDb,
    private readonly chains: ChainsService,
    private readonly workshop: WorkshopService,
  ) {}

  async read(actor: Actor, chainId: string): Promise<Usage> {
    const chain = await this.chains.reach(actor, chainId);
    const { settings } = await this.workshop.current(actor.workshopId);
    const rides = (await loadRides(this.db.manager, [chainId], [])).ofChain.get(chainId) ?? [];
    const { treatments } = await readRecords(this.db.manager, [chainId], []);
    return {
      cycles: toCycles(rides, treatments.get(chainId) ?? [], dayOf(chain.inServiceOn), settings.factors),
    };
  }
}

/** Cuts a chain's rides at its treatments: one cycle for each, and one before the first where there was riding. */
export function toCycles(
  rides: Ride[],
  treatments: Treatment[],
  inServiceOn: number,
  factors: Factors,
): Cycle[] {
  const starts = [{ id: null, kind: null, day: inServiceOn }, ...treatments];
  const ordered = [...rides].sort((a, b) => a.day - b.day);
  return starts
    .map(({ id, kind, day }, i): Cycle => {
      const next = starts[i + 1]?.day ?? Infinity;
      const inCycle = ordered.filter((ride) => (i === 0 || ride.day > day) && ride.day <= next);
      return {
        treatmentId: id,
        kind,
        from: isoDay(day),
        to: Number.isFinite(next) ? isoDay(next) : null,
        points: cumulate(inCycle, day, factors),
      };
    })
    .filter(({ treatmentId, points }) => treatmentId !== null || points.length > 1);
}

function cumulate(rides: Ride[], start: number, factors: Factors): Cycle['points'] {
  let km = 0;
  let lubeKm = 0;
  const byDay = new Map([[isoDay(start), { km, lubeKm }]]);
  for (const ride of rides) {
    km += ride.km;
    lubeKm += equivalentKm(ride, factors).lubeKm;
    byDay.set(isoDay(ride.day), { km, lubeKm });
  }
  return [...byDay].map(([day, sums]) => ({ day, ...sums }));
}
