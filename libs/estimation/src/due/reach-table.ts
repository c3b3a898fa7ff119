import { LEVELS, RidingForecast } from '../types';

/** Neighbouring distances that the forecast is asked for are at most this far apart in log km. */
const GAP = 0.35;
const MOST = 12;

/** The forecast's days to reach, asked for a few distances between low and high and linear in log km between them. */
export function reachTable(
  forecast: RidingForecast,
  low: number,
  high: number,
): (km: number) => readonly number[] {
  const range = Math.log(high / low);
  const steps = Math.min(Math.max(Math.ceil(range / GAP), 1), MOST - 1);
  if (range < 1e-9) {
    const days = forecast.daysToReach(low);
    return () => days;
  }
  const rows = Array.from({ length: steps + 1 }, (_, i) =>
    forecast.daysToReach(low * Math.exp((range * i) / steps)),
  );
  return (km) => {
    const t = Math.min(Math.max((Math.log(km / low) / range) * steps, 0), steps);
    const i = Math.min(Math.floor(t), steps - 1);
    return LEVELS.map((_, l) => rows[i]![l]! + (t - i) * (rows[i + 1]![l]! - rows[i]![l]!));
  };
}
