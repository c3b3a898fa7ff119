import type { ElongationPosterior } from '../elongation/posterior';
import type { Alert, ChainHistory } from '../types';
import type { DueState } from './state';

/** What cannot wait for a window: rust after a wet ride, a spent treatment, a chain past its limit, a log gone quiet. */
export function chainAlerts(
  history: ChainHistory,
  state: DueState,
  posterior: ElongationPosterior,
  shareUsed: number,
): Alert[] {
  const { today, limitPct, rides, readings } = history;
  const alerts: Alert[] = [];
  const wet = rides.filter(
    ({ day, weather }) =>
      (weather === 'wet' || weather === 'mud') &&
      day > state.treatment.since &&
      day >= today - 2 &&
      day <= today,
  );
  if (wet.length > 0) {
    const day = Math.max(...wet.map((ride) => ride.day));
    alerts.push({ code: 'wet-ride-rust', day, data: { rides: wet.length } });
  }
  const chancePast = posterior.chancePast(state.usage.wearKm, limitPct);
  if (chancePast >= 0.5)
    alerts.push({ code: 'past-limit', day: today, data: { chance: Math.round(100 * chancePast) } });
  if (history.fitted && shareUsed >= 1.1)
    alerts.push({ code: 'treatment-spent', day: today, data: { share: Math.round(100 * shareUsed) } });
  if (history.fitted && state.forecast.quiet) alerts.push({ code: 'quiet-log', day: today, data: {} });
  for (const reading of readings) {
    if ((posterior.doubt.get(reading.id) ?? 0) > 0.5)
      alerts.push({ code: 'doubted-reading', day: reading.day, data: { readingId: reading.id } });
  }
  return alerts;
}
