import type { Band, ChainHistory, ElongationPoint, RidingForecast } from '../types';
import type { Usage } from '../usage';
import type { ElongationPosterior } from './posterior';

const PAST_POINTS = 40;
const AHEAD_POINTS = 30;
const KNOTS = 7;
/** The chart ends after two years at most. */
const MOST_DAYS = 731;

/** Predicted elongation with its band from the first day to the far end of the replacement window, for the chart. */
export function elongationCurve(
  { inServiceOn, today }: Pick<ChainHistory, 'inServiceOn' | 'today'>,
  usage: Usage,
  posterior: ElongationPosterior,
  wearKmAhead: number,
  forecast: RidingForecast,
  wearPerKm: number,
): ElongationPoint[] {
  const start = Math.min(inServiceOn, today);
  const perDay = Math.max((forecast.kmPerWeek.p50 / 7) * wearPerKm, 0.2);
  const daysAhead = Math.min(Math.max(wearKmAhead / perDay, 28), MOST_DAYS);
  const points: { day: number; wearKm: number }[] = [];
  const past = Math.min(PAST_POINTS, today - start);
  for (let i = 0; i <= past; i++) {
    const day = past === 0 ? today : Math.round(start + ((today - start) * i) / past);
    points.push({ day, wearKm: usage.wearKmAt(day) });
  }
  for (let i = 1; i <= AHEAD_POINTS; i++) {
    const days = Math.round((daysAhead * i) / AHEAD_POINTS);
    points.push({ day: today + days, wearKm: usage.wearKm + days * perDay });
  }
  const bandAt = between(posterior, points[points.length - 1]!.wearKm);
  return points.map((point) => ({ ...point, ...bandAt(point.wearKm) }));
}

/** Elongation's band over 0..furthest wear km, worked out at a few knots: between them it is all but straight. */
function between(posterior: ElongationPosterior, furthest: number): (wearKm: number) => Band {
  const at = (i: number) => furthest * (i / (KNOTS - 1)) ** 1.5;
  const bands = Array.from({ length: KNOTS }, (_, i) => posterior.elongationAt(at(i)));
  return (wearKm) => {
    let i = 1;
    while (i < KNOTS - 1 && at(i) < wearKm) i++;
    const span = at(i) - at(i - 1);
    const share = span > 0 ? (wearKm - at(i - 1)) / span : 0;
    const mix = (of: keyof Band) => bands[i - 1]![of] + share * (bands[i]![of] - bands[i - 1]![of]);
    return { p10: mix('p10'), p50: mix('p50'), p90: mix('p90') };
  };
}
