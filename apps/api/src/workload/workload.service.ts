import { Injectable } from '@nestjs/common';
import type { Regime, Workload } from '@halfpitch/contracts';
import type { KeptChances } from '@halfpitch/estimation';
import { comeChance, dayOf, isoDay, waitingVisits, withRenewals } from '@halfpitch/estimation';
import { Clock } from '../common/clock';
import { TenantDb } from '../database/tenant-db';
import type { EstimateDetail } from '../estimates/estimate.entity';
import type { StoredSettings } from '../workshop/workshop.entity';
import { WorkshopService } from '../workshop/workshop.service';
import { answers, summary } from './answers';
import { band, counts, map, plus } from './counts';
import { ChainChance, chainsOfWeek, mondayOf, shiftWeeks } from './week-chances';

const WEEKS = 12;

interface Row {
  chainId: string;
  label: string;
  regime: Regime;
  riderName: string;
  madeOn: string;
  weekly: EstimateDetail['weekly'];
  lubricationNow: number | null;
  replacementNow: number;
}

const NEWEST = `
  select chain.id as "chainId", chain.label, chain.regime, rider.name as "riderName",
         estimate.made_on::text as "madeOn", detail -> 'weekly' as weekly,
         (detail -> 'lubrication' ->> 'chanceNow')::float8 as "lubricationNow",
         (detail -> 'replacement' ->> 'chanceNow')::float8 as "replacementNow"
  from chain join rider on rider.id = chain.rider_id
  join lateral (
    select made_on, detail from estimate
    where chain_id = chain.id order by made_on desc limit 1) estimate on true
  where chain.retired_on is null`;

function toChance(
  { chainId, label, riderName, regime, madeOn, weekly, ...now }: Row,
  monday: number,
): ChainChance {
  const shift = (kept: KeptChances) => shiftWeeks(kept, dayOf(madeOn), monday, WEEKS);
  return {
    chainId,
    label,
    riderName,
    dipped: regime === 'immersion-wax',
    lubrication: weekly.lubrication && shift({ now: now.lubricationNow ?? 0, weekly: weekly.lubrication }),
    renewal: weekly.renewal,
    replacement: shift({ now: now.replacementNow, weekly: weekly.replacement }),
  };
}

/** The coming twelve weeks, summed exactly from every chain's own chances. */
@Injectable()
export class WorkloadService {
  constructor(
    private readonly db: TenantDb,
    private readonly workshops: WorkshopService,
    private readonly clock: Clock,
  ) {}

  async read(workshopId: string): Promise<Workload> {
    const { settings, timeZone } = await this.workshops.current(workshopId);
    const today = this.clock.today(timeZone);
    const monday = mondayOf(dayOf(today));
    const answered = await answers(this.db.manager, today);
    const comes = comeChance(answered);
    const rows = await this.db.manager.query<Row[]>(NEWEST);
    const chains = rows.map((row) => toChance(row, monday));
    const visits = chains.map(({ lubrication, renewal, dipped }) => ({
      dipped,
      chances: lubrication ? withRenewals(lubrication, WEEKS, renewal, comes) : [],
    }));
    const replacing = chains.map(({ replacement }) => waitingVisits(replacement, WEEKS, comes));
    return {
      minutesPerWeek: settings.bench.minutesPerWeek,
      coming: { chancePerWeek: comes, ...summary(answered) },
      weeks: Array.from({ length: WEEKS }, (_, w) => {
        const inWeek = visits.map(({ dipped, chances }) => ({ dipped, chance: chances[w] ?? 0 }));
        return {
          from: isoDay(monday + 7 * w),
          to: isoDay(monday + 7 * w + 6),
          ...weekLoad(
            inWeek,
            replacing.map((chances) => chances[w]!),
            settings.bench,
          ),
          chains: chainsOfWeek(chains, w),
        };
      }),
    };
  }
}

/** What a week's visits come to: chains are independent of each other, so every sum is exact. */
function weekLoad(
  visits: { dipped: boolean; chance: number }[],
  replacing: number[],
  bench: StoredSettings['bench'],
) {
  const treatments = counts(visits.map(({ chance }) => chance));
  const replacements = counts(replacing);
  const dips = counts(visits.flatMap(({ dipped, chance }) => (dipped ? [chance] : [])));
  return {
    treatments: band(treatments),
    replacements: band(replacements),
    benchMinutes: band(
      plus(
        map(treatments, (n) => n * bench.minutesPerTreatment),
        map(replacements, (n) => n * bench.minutesPerReplacement),
      ),
    ),
    potLoads: band(map(dips, (n) => Math.ceil(n / bench.chainsPerPotLoad))),
  };
}
