import { factorTable } from '../distance/factor-table';
import type { ChainHistory, Factors, PreviousEstimate, Reason, Ride } from '../types';
import { freshUnloggedKm, movedBy } from './moved';
import type { DueState } from './state';

const about = 'lubrication' as const;
/** Km a day below which a rider's days are not counted out: the sentence would speak of months. */
const LEAST_KM_A_DAY = 0.5;

const isWet = ({ weather, surface }: Ride) =>
  surface !== 'indoor' && (weather === 'wet' || weather === 'mud' || weather === 'damp');
const isRough = (ride: Ride) => (ride.surface === 'gravel' || ride.surface === 'mountain') && !isWet(ride);

/**
 * What moved the lubrication window, in days at the riding expected. What was ridden splits into more or less km than
 * expected, and km that counted for more than a km of this rider's usually does.
 */
export function lubricationReasons(
  history: ChainHistory,
  previous: PreviousEstimate,
  factors: Factors,
  { lubrication, forecast, treatment, perKm, usage }: DueState,
): Reason[] {
  if (!lubrication) return [];
  const moved = movedBy(previous.lubricationP50, lubrication.p50);
  if (treatment.since > previous.day) {
    const code = treatment.given === 'new-chain' ? 'new-chain' : 'treatment';
    return [{ code, about, days: moved, data: {} }];
  }
  if (lubrication.decidedBy === 'calendar') return [{ code: 'calendar-limit', about, days: 0, data: {} }];

  const { today, rides, planned } = history;
  const kmADay = Math.max(forecast.kmPerWeek.p50 / 7, LEAST_KM_A_DAY);
  const fresh = rides.filter(({ day }) => day > previous.day && day <= today);
  const factorOf = factorTable(factors);
  const harder = (code: Reason['code'], hard: Ride[]): Reason[] => {
    const extra = hard.reduce((sum, r) => sum + r.km * Math.max(factorOf(r).lube / perKm.lube - 1, 0), 0);
    const data = { rides: hard.length, km: Math.round(kmOf(hard)) };
    return hard.length === 0 ? [] : [{ code, about, days: -Math.round(extra / kmADay), data }];
  };
  const reasons = [
    ...harder('wet-rides', fresh.filter(isWet)),
    ...harder('rough-rides', fresh.filter(isRough)),
  ];

  const usual = (forecast.kmPerWeek.p50 / 7) * (today - previous.day);
  const days = Math.round((usual - kmOf(fresh)) / kmADay);
  const code = days < 0 ? 'riding-more' : 'riding-less';
  reasons.push({ code, about, days, data: { km: Math.round(kmOf(fresh)), usual: Math.round(usual) } });

  const unlogged = freshUnloggedKm(usage.unlogged, previous.day, treatment.since);
  if (unlogged > 0) {
    const data = { km: Math.round(unlogged) };
    reasons.push({ code: 'unlogged-distance', about, days: -Math.round(unlogged / kmADay), data });
  }
  const ahead = planned.filter(({ to }) => to > today);
  if (ahead.length > 0) {
    const rest = moved - reasons.reduce((sum, reason) => sum + reason.days, 0);
    const km = Math.round(ahead.reduce((sum, plan) => sum + plan.km, 0));
    reasons.push({ code: 'planned-riding', about, days: Math.min(rest, 0), data: { km } });
  }
  if (forecast.quiet) reasons.push({ code: 'quiet-log', about, days: Math.max(moved, 0), data: {} });
  return reasons;
}

const kmOf = (rides: readonly Ride[]) => rides.reduce((sum, { km }) => sum + km, 0);
