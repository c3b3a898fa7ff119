import { HORIZON_DAYS } from '../riding';
import { Day, DueWindow, LEVELS, RidingForecast } from '../types';

const WEEKS = 26;

/** Km still to ride until due, as weighted atoms; zero or less is due already. */
export interface KmLeft {
  values: readonly number[];
  weights: readonly number[];
}

/** cdf[d] = chance of being due by d days from today, d = 0..horizon. */
export function dueCdf(left: KmLeft, forecast: RidingForecast): Float64Array {
  const cdf = new Float64Array(HORIZON_DAYS + 1);
  const total = left.weights.reduce((sum, w) => sum + w, 0);
  left.values.forEach((km, i) => {
    const weight = left.weights[i]! / total;
    if (weight <= 0) return;
    if (km <= 0) cdf[0]! += weight;
    else spread(cdf, forecast.daysToReach(km), weight);
  });
  for (let d = 1; d < cdf.length; d++) cdf[d]! += cdf[d - 1]!;
  return cdf;
}

/** Adds `weight` over the days, even between neighbouring levels; what lies beyond the horizon falls off the end. */
function spread(density: Float64Array, days: readonly number[], weight: number): void {
  const first = days[0]!;
  const last = days[days.length - 1]!;
  const edges = [
    Math.max(1, 1.3 * first - 0.3 * days[1]!),
    ...days,
    1.3 * last - 0.3 * days[days.length - 2]! + 1,
  ];
  const levels = [0, ...LEVELS, 1];
  for (let i = 1; i < edges.length; i++) {
    const share = (levels[i]! - levels[i - 1]!) * weight;
    const from = Math.round(edges[i - 1]!);
    const to = Math.max(Math.round(edges[i]!), from + 1);
    for (let d = from; d < to && d < HORIZON_DAYS; d++) density[d]! += share / (to - from);
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
