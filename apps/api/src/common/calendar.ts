import { unprocessable } from './problems';

/** Calendar days as the estimation library counts them, whole days since 1970-01-01, and back. */
export { dayOf as dayNumber, isoDay as dayOfNumber } from '@halfpitch/estimation';

/** A day that has not come yet cannot have been lived: refused, naming the field. */
export function refuseFuture(day: string, today: string, path = 'day'): void {
  if (day > today) throw unprocessable(path, `${day} is still to come; today is ${today}.`);
}

/** The same day of the month, `years` earlier; 29 February becomes 1 March. */
export function yearsBefore(day: string, years: number): string {
  const date = new Date(`${day}T00:00:00Z`);
  date.setUTCFullYear(date.getUTCFullYear() - years);
  return date.toISOString().slice(0, 10);
}

/** The day `days` later, or earlier where negative. */
export function plusDays(day: string, days: number): string {
  const date = new Date(`${day}T00:00:00Z`);
  date.setUTCDate(date.getUTCDate() + days);
  return date.toISOString().slice(0, 10);
}
