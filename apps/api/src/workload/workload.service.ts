import { Injectable } from '@nestjs/common';
import type { Workload } from '@halfpitch/contracts';
import { workload, WeekLoad } from '@halfpitch/estimation';
import { dayNumber, dayOfNumber } from '../common/calendar';
import { Clock } from '../common/clock';
import { TenantDb } from '../database/tenant-db';
import { WorkshopService } from '../workshop/workshop.service';
import type { Workshop } from '../workshop/workshop.entity';
import { ChainChance, chainsOfWeek, shiftWeeks } from './week-chances';

const WEEKS = 12;
/** Share of riders who come when written to; until reminders have taught better. Our judgement, no source. */
const COMES = 0.85;

interface Row {
  chain_id: string;
  label: string;
  rider_name: string;
  made_on: string;
  weekly: { lubrication: number[] | null; replacement: number[] };
}

const NEWEST = `
  select chain.id as chain_id, chain.label, rider.name as rider_name, estimate.made_on::text,
         estimate.detail -> 'weekly' as weekly
  from chain join rider on rider.id = chain.rider_id
  join lateral (
    select made_on, detail from estimate where chain_id = chain.id order by made_on desc limit 1) estimate on true
  where chain.retired_on is null`;

type Bench = Workshop['settings']['bench'];

/** The coming twelve weeks, summed exactly from every chain's own chances. */
@Injectable()
export class WorkloadService {
  constructor(
    private readonly db: TenantDb,
    private readonly workshop: WorkshopService,
    private readonly clock: Clock,
  ) {}

  async read(workshopId: string): Promise<Workload> {
    const { settings, timeZone } = await this.workshop.current(workshopId);
    const today = dayNumber(this.clock.today(timeZone));
    const rows = await this.db.manager.query<Row[]>(NEWEST);
    const chains = rows.map((row): ChainChance => {
      const madeOn = dayNumber(row.made_on);
      const { lubrication, replacement } = row.weekly;
      return {
        chainId: row.chain_id,
        label: row.label,
        riderName: row.rider_name,
        lubrication: lubrication && shiftWeeks(lubrication, madeOn, today, WEEKS),
        replacement: shiftWeeks(replacement, madeOn, today, WEEKS),
      };
    });
    const weeks = workload(chains, { weeks: WEEKS, comes: COMES });
    return {
      minutesPerWeek: settings.bench.minutesPerWeek,
      weeks: weeks.map((week, w) => ({
        from: dayOfNumber(today + 7 * w),
        to: dayOfNumber(today + 7 * w + 6),
        ...withBench(week, settings.bench),
        chains: chainsOfWeek(chains, w),
      })),
    };
  }
}

/** Bench time and pot loads that a week's counts ask for. */
function withBench({ treatments, replacements }: WeekLoad, bench: Bench) {
  const each = (of: (treatments: number, replacements: number) => number) => ({
    p10: of(treatments.p10, replacements.p10),
    p50: of(treatments.p50, replacements.p50),
    p90: of(treatments.p90, replacements.p90),
    mean: of(treatments.mean, replacements.mean),
  });
  return {
    treatments,
    replacements,
    benchMinutes: each((t, r) => t * bench.minutesPerTreatment + r * bench.minutesPerReplacement),
    potLoads: each((t) => Math.ceil(t / bench.chainsPerPotLoad)),
  };
}
