import type { Alert, ChainHistory, Ride } from '../types';
import type { DueState } from './state';

/** A wet chain is told of for this many days after the ride: after that it has rusted or been seen to. */
const RUST_DAYS = 2;

/** What cannot wait for a window: rust after a wet ride, a spent treatment, a chain past its limit, a log gone quiet. */
export function chainAlerts(history: ChainHistory, state: DueState): Alert[] {
  const { today, readings, fitted } = history;
  const alerts: Alert[] = [];
  const wet = wetSinceTreatment(history, state.treatment.since);
  if (wet.length > 0) {
    const day = wet.reduce((last, ride) => Math.max(last, ride.day), -Infinity);
    alerts.push({ code: 'wet-ride-rust', day, data: { rides: wet.length } });
  }
  if (state.chancePast >= 0.5)
    alerts.push({ code: 'past-limit', day: today, data: { chance: Math.round(100 * state.chancePast) } });
  if (fitted && state.shareUsed >= 1.1)
    alerts.push({ code: 'treatment-spent', day: today, data: { share: Math.round(100 * state.shareUsed) } });
  if (fitted && state.forecast.quiet) alerts.push({ code: 'quiet-log', day: today, data: {} });
  for (const { readingId } of state.doubted) {
    const day = readings.find(({ id }) => id === readingId)?.day ?? today;
    alerts.push({ code: 'doubted-reading', day, data: { readingId } });
  }
  if (state.doubtfulArrival) {
    const { day, lubeKm } = state.doubtfulArrival;
    alerts.push({ code: 'doubted-arrival', day, data: { km: Math.round(lubeKm) } });
  }
  return alerts;
}

/** Outdoor rides in the wet after the treatment and within the last days. */
function wetSinceTreatment({ rides, today }: ChainHistory, since: number): Ride[] {
  const from = Math.max(since + 1, today - RUST_DAYS);
  return rides.filter(
    ({ day, weather, surface }) =>
      day >= from && day <= today && surface !== 'indoor' && (weather === 'wet' || weather === 'mud'),
  );
}
