import { HORIZON_DAYS } from '../riding';
import { Day, DueWindow, LEVELS, RidingForecast } from '../types';
import type { KmLeft } from './km-left';
import { reachTable } from './reach-table';

const WEEKS = 26;

/** cdf[d] = chance of being due by d days from today, d = 0..horizon. */
export function dueCdf(left: KmLeft, forecast: RidingForecast): Float64Array {
  const cdf = new Float64Array(HORIZON_DAYS + 1);
  const ahead = left.filter((km) => km > 0);
  if (ahead.length > 0) {
    const reach = reachTable(forecast, ahead[0]!, ahead[ahead.length - 1]!);
    for (const km of ahead) spread(cdf, reach(km), 1 / left.length);
  }
  // `spread` left changes of the density: summed once they are the density, twice the distribution.
  let density = 0;
  let sum = (left.length - ahead.length) / left.length;
  for (let d = 0; d < cdf.length; d++) {
    density += cdf[d]!;
    sum += density;
    cdf[d] = Math.min(Math.max(sum, 0), 1);
  }
  return cdf;
}

const EDGES = [0, ...LEVELS, 1];

/** Adds `weight` evenly over the days between neighbouring levels; what lies beyond the horizon falls off the end. */
function spread(changes: Float64Array, days: readonly number[], weight: number): void {
  const last = days.length - 1;
  let from = Math.round(Math.max(1, 1.3 * days[0]! - 0.3 * days[1]!));
  for (let i = 1; i < EDGES.length; i++) {
    const edge = i <= last + 1 ? days[i - 1]! : 1.3 * days[last]! - 0.3 * days[last - 1]! + 1;
    const to = Math.max(Math.round(edge), from + 1);
    const daily = ((EDGES[i]! - EDGES[i - 1]!) * weight) / (to - from);
    if (from < HORIZON_DAYS) changes[from]! += daily;
    if (from < HORIZON_DAYS) changes[Math.min(to, HORIZON_DAYS)]! -= daily;
    from = Math.max(Math.round(edge), 1);
  }
}

function firstDay(cdf: Float64Array, p: number, today: Day): Day | null {
  const d = cdf.findIndex((c) => c >= p - 1e-12);
  return d < 0 ? null : today + d;
}

/** Publishes a due distribution as a window; a calendar limit `limitDay` cuts it off. */
export function dueWindow(cdf: Float64Array, today: Day, limitDay: Day | null): DueWindow {
  const limit = limitDay === null ? Infinity : Math.max(limitDay - today, 0);
  const cut = cdf.map((c, d) => Math.min(d >= limit ? 1 : c, 1));
  const within = (days: number) => cut[days]!;
  return {
    p10: firstDay(cut, 0.1, today),
    p50: firstDay(cut, 0.5, today),
    p90: firstDay(cut, 0.9, today),
    chanceNow: within(0),
    chanceWithin7: within(7),
    chanceWithin14: within(14),
    chanceWithin30: within(30),
    weeklyChance: Array.from({ length: WEEKS }, (_, w) => cut[7 * w + 6]! - (w === 0 ? 0 : cut[7 * w - 1]!)),
    decidedBy: limit <= HORIZON_DAYS && (cdf[limit] ?? 1) < 0.5 ? 'calendar' : 'distance',
  };
}
