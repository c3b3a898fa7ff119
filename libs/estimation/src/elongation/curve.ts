import type { ChainHistory, ElongationPoint, RidingForecast } from '../types';
import type { Usage } from '../usage';
import type { ElongationPosterior } from './posterior';

const PAST_POINTS = 40;
const AHEAD_POINTS = 30;

/** Predicted elongation with its band from the first day to the far end of the replacement window, for the chart. */
export function elongationCurve(
  { inServiceOn, today }: ChainHistory,
  usage: Usage,
  posterior: ElongationPosterior,
  wearKmAhead: number,
  forecast: RidingForecast,
  wearPerKm: number,
): ElongationPoint[] {
  const start = Math.min(inServiceOn, today);
  const points: ElongationPoint[] = [];
  const steps = Math.min(PAST_POINTS, today - start);
  for (let i = 0; i <= steps; i++) {
    const day = steps === 0 ? today : Math.round(start + ((today - start) * i) / steps);
    const wearKm = usage.wearKmAt(day);
    points.push({ day, wearKm, ...posterior.elongationAt(wearKm) });
  }
  const perDay = Math.max((forecast.kmPerWeek.p50 / 7) * wearPerKm, 0.2);
  const daysAhead = Math.min(Math.max(wearKmAhead / perDay, 28), 731);
  for (let i = 1; i <= AHEAD_POINTS; i++) {
    const days = Math.round((daysAhead * i) / AHEAD_POINTS);
    const wearKm = usage.wearKm + days * perDay;
    points.push({ day: today + days, wearKm, ...posterior.elongationAt(wearKm) });
  }
  return points;
}
