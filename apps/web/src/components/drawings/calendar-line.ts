import { addDays, eachMonthOfInterval, eachWeekOfInterval, format, parseISO } from 'date-fns';
import { daysBetween } from '../../app/format';

export const [FROM, TO] = [12, 468] as const;
/** Where the line lies, drawing units from the top. */
export const AXIS = 66;
/** The farthest that is drawn, days: two years, beyond which the estimate makes no claim. */
const HORIZON = 730;

export interface Days {
  /** Calendar days, YYYY-MM-DD; null = not within two years. */
  p10: string | null;
  p50: string | null;
  p90: string | null;
  today: string;
  /** When it is booked in. */
  appointment?: string | null;
}

const iso = (date: Date) => format(date, 'yyyy-MM-dd');
const plus = (day: string, days: number) => iso(addDays(parseISO(day), days));

/** First and last day drawn: today, the whole band and the booking, with room on both sides. */
export function calendarSpan({ p10, p50, p90, today, appointment }: Days): { start: string; end: string } {
  const first = p10 !== null && p10 < today ? p10 : today;
  const known = p90 ?? p50 ?? p10;
  const far = known === null || (p90 === null && daysBetween(today, known) > 365);
  const last = [far ? plus(today, HORIZON) : known, today, appointment ?? today].sort().at(-1)!;
  const open = p90 === null && known !== null ? 90 : 0;
  const length = Math.max(28, daysBetween(first, last) + open);
  const room = Math.ceil(length * 0.12);
  return { start: plus(first, -room), end: plus(first, length + room) };
}

/** Days to drawing units. */
export function dayScale({ start, end }: { start: string; end: string }): (day: string) => number {
  const length = daysBetween(start, end);
  return (day) => FROM + (Math.min(length, Math.max(0, daysBetween(start, day))) / length) * (TO - FROM);
}

/** Mondays, where they are not too many to be told apart. */
export function weekTicks({ start, end }: { start: string; end: string }): string[] {
  if (daysBetween(start, end) > 40 * 7) return [];
  const weeks = eachWeekOfInterval({ start: parseISO(start), end: parseISO(end) }, { weekStartsOn: 1 });
  return weeks.map(iso).filter((day) => day >= start);
}

/** Month steps that keep January in: a new year is always named. */
const STEPS = [1, 2, 3, 4, 6, 12] as const;

/** Firsts of a month with their words, as many as there is room for; January is its year. */
export function monthTicks({ start, end }: { start: string; end: string }): { day: string; word: string }[] {
  const months = eachMonthOfInterval({ start: parseISO(start), end: parseISO(end) });
  const step = STEPS.find((each) => months.length / each <= 8) ?? 12;
  const shown = months.filter((month) => iso(month) >= start);
  return shown.map((month) => {
    const word = format(month, month.getMonth() === 0 ? 'yyyy' : 'MMM');
    return { day: iso(month), word: month.getMonth() % step === 0 ? word : '' };
  });
}
