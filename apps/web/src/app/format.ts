import { differenceInCalendarDays, parseISO } from 'date-fns';

export { dayWords, reasonWords, spanWords, windowWords } from '@halfpitch/contracts';
export { chance, distance, elongation, METRES_IN, percent } from './figures';

/** Days from one calendar day to another, both YYYY-MM-DD; negative when it lies before. */
export const daysBetween = (from: string, to: string): number =>
  differenceInCalendarDays(parseISO(to), parseISO(from));

const relative = new Intl.RelativeTimeFormat('en-GB', { numeric: 'auto' });

/** 'today', 'tomorrow', 'in 5 days', '3 weeks ago'. */
export function relativeDay(day: string, today: string): string {
  const days = daysBetween(today, day);
  if (Math.abs(days) < 14) return relative.format(days, 'day');
  if (Math.abs(days) < 61) return relative.format(Math.trunc(days / 7), 'week');
  return relative.format(Math.trunc(days / 30.44), 'month');
}

/** Minor units of a currency as '£12.50'. */
export function money(minor: number, currency: string): string {
  const style = new Intl.NumberFormat('en-GB', { style: 'currency', currency });
  return style.format(minor / 10 ** (style.resolvedOptions().maximumFractionDigits ?? 2));
}

/** Seconds as '2 h 05 min' or '45 min'. */
export function duration(seconds: number): string {
  const minutes = Math.round(seconds / 60);
  const [hours, rest] = [Math.floor(minutes / 60), minutes % 60];
  return hours === 0 ? `${rest} min` : `${hours} h ${String(rest).padStart(2, '0')} min`;
}

/** An instant in the workshop's time zone: '3 March 2026, 18:05'. */
export const instantWords = (instant: string, timeZone: string): string =>
  new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeStyle: 'short', timeZone }).format(
    new Date(instant),
  );
