import { rideFactor } from '../distance/equivalent-km';
import type { ChainHistory, Day, Factors, PreviousEstimate, Reason, Ride } from '../types';
import type { DueState } from './state';

const MEASURABLE_DAYS = 1;
const MOST = 4;

/** What moved the windows since the last estimate, the strongest first. */
export function whyMoved(history: ChainHistory, factors: Factors, state: DueState): Reason[] {
  const { previous } = history;
  if (!previous) return [{ code: 'first-estimate', about: 'lubrication', days: 0, data: {} }];
  const reasons = [
    ...lubricationReasons(history, previous, factors, state),
    ...replacementReasons(history, previous, state),
  ];
  return reasons
    .filter(
      ({ code, days }) =>
        Math.abs(days) >= MEASURABLE_DAYS || code === 'treatment' || code === 'calendar-limit',
    )
    .sort((a, b) => Math.abs(b.days) - Math.abs(a.days))
    .slice(0, MOST);
}

const between = (from: Day | null, to: Day | null) => (from === null || to === null ? 0 : to - from);

function lubricationReasons(
  history: ChainHistory,
  previous: PreviousEstimate,
  factors: Factors,
  state: DueState,
): Reason[] {
  const { lubrication, forecast, treatment } = state;
  if (!lubrication) return [];
  const about = 'lubrication' as const;
  const moved = between(previous.lubricationP50, lubrication.p50);
  if (treatment.since > previous.day) return [{ code: 'treatment', about, days: moved, data: {} }];
  const fresh = history.rides.filter(({ day }) => day > previous.day && day <= history.today);
  const perDay = Math.max(forecast.kmPerWeek.p50 / 7, 0.1) * state.perKm.lube;
  const reasons: Reason[] = [
    ...harder(
      'wet-rides',
      fresh,
      ({ weather }) => weather === 'wet' || weather === 'mud' || weather === 'damp',
      factors,
      perDay,
    ),
    ...harder(
      'rough-rides',
      fresh,
      ({ surface, weather }) => surface !== 'road' && (weather === 'dry' || weather === 'unknown'),
      factors,
      perDay,
    ),
  ];
  const km = fresh.reduce((total, ride) => total + ride.km, 0);
  const usual = (forecast.kmPerWeek.p50 / 7) * (history.today - previous.day);
  const days = Math.round((usual - km) / Math.max(forecast.kmPerWeek.p50 / 7, 0.1));
  reasons.push({
    code: days < 0 ? 'riding-more' : 'riding-less',
    about,
    days,
    data: { km: Math.round(km), usual: Math.round(usual) },
  });
  if (history.planned.some(({ to }) => to > history.today)) {
    const planned = history.planned.reduce((total, p) => total + (p.to > history.today ? p.km : 0), 0);
    const left = moved - reasons.reduce((total, reason) => total + reason.days, 0);
    reasons.push({
      code: 'planned-riding',
      about,
      days: Math.min(left, 0),
      data: { km: Math.round(planned) },
    });
  }
  if (lubrication.decidedBy === 'calendar')
    reasons.push({ code: 'calendar-limit', about, days: 0, data: {} });
  if (forecast.quiet) reasons.push({ code: 'quiet-log', about, days: Math.max(moved, 0), data: {} });
  return reasons;
}

/** Rides that counted for more than their distance: how many days earlier they made it. */
function harder(
  code: 'wet-rides' | 'rough-rides',
  rides: Ride[],
  counts: (ride: Ride) => boolean,
  factors: Factors,
  perDay: number,
): Reason[] {
  const hard = rides.filter(counts);
  const extra = hard.reduce((total, ride) => total + ride.km * (rideFactor(ride, factors).lube - 1), 0);
  const km = hard.reduce((total, ride) => total + ride.km, 0);
  if (hard.length === 0) return [];
  return [
    {
      code,
      about: 'lubrication',
      days: -Math.round(extra / perDay),
      data: { rides: hard.length, km: Math.round(km) },
    },
  ];
}

function replacementReasons(
  { readings, today }: ChainHistory,
  previous: PreviousEstimate,
  { replacement }: DueState,
): Reason[] {
  const fresh = readings.filter(({ day }) => day > previous.day && day <= today);
  if (fresh.length === 0) return [];
  const days = between(previous.replacementP50, replacement.p50);
  return [{ code: 'reading', about: 'replacement', days, data: { readings: fresh.length } }];
}
