import type { DistanceUnit } from '@halfpitch/contracts';
import { differenceInCalendarDays, parseISO } from 'date-fns';

export { dayWords, reasonWords, spanWords, windowWords } from '@halfpitch/contracts';

/** The statute mile: 1,609.344 m exactly (international yard and pound agreement, 1959; memory). */
export const METRES_IN: Record<DistanceUnit, number> = { km: 1000, mi: 1609.344 };

const decimals = (most: number, least = 0) =>
  new Intl.NumberFormat('en-GB', { maximumFractionDigits: most, minimumFractionDigits: least });
const [whole, tenths] = [decimals(0), decimals(1)];

/** Metres as '42.5 km' or '1,204 mi': tenths below 100, whole above. */
export function distance(metres: number, unit: DistanceUnit): string {
  const value = metres / METRES_IN[unit];
  return `${(Math.abs(value) < 99.95 ? tenths : whole).format(value)} ${unit}`;
}

/** A share, 1 = all, as '72 %'. */
export const percent = (share: number): string => `${whole.format(share * 100)} %`;

/** A percentage as it is, '0.38 %': elongation and its limits. */
export const elongation = (value: number): string => `${decimals(2, 2).format(value).replace('-', '−')} %`;

/** A chance, 0 to 1, in steps that do not boast: 'under 1 %', '40 %', 'over 99 %'. */
export function chance(value: number): string {
  if (value < 0.01) return 'under 1 %';
  return value > 0.99 ? 'over 99 %' : percent(value);
}

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
