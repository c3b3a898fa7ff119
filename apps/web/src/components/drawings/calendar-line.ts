import { addDays, eachMonthOfInterval, eachWeekOfInterval, format, parseISO } from 'date-fns';
import { daysBetween } from '../../app/format';

export const [FROM, TO] = [12, 468] as const;
/** The farthest that is drawn, days: two years, beyond which the estimate makes no claim. */
const HORIZON = 730;

export interface Days {
  /** Calendar days, YYYY-MM-DD; null = not within two years. */
  p10: string | null;
  p50: string | null;
  p90: string | null;
  today: string;
}

const iso = (date: Date) => format(date, 'yyyy-MM-dd');
const plus = (day: string, days: number) => iso(addDays(parseISO(day), days));

/** First and last day drawn: today and the whole band with room on both sides. */
export function calendarSpan({ p10, p50, p90, today }: Days): { start: string; end: string } {
  const first = p10 !== null && p10 < today ? p10 : today;
  const known = p90 ?? p50 ?? p10;
  const last =
    known === null || (p90 === null && daysBetween(today, known) > 365) ? plus(today, HORIZON) : known;
  const far = p90 === null && known !== null ? 90 : 0;
  const length = Math.max(28, daysBetween(first, last < today ? today : last) + far);
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

/** Firsts of a month with their words, as many as there is room for. */
export function monthTicks(span: { start: string; end: string }): { day: string; word: string }[] {
  const months = eachMonthOfInterval({ start: parseISO(span.start), end: parseISO(span.end) });
  const step = Math.ceil(months.length / 8);
  const shown = months.filter((month) => iso(month) >= span.start);
  return shown.map((month, i) => {
    const word = month.getMonth() === 0 ? format(month, 'MMM yyyy') : format(month, 'MMM');
    return { day: iso(month), word: i % step === 0 ? word : '' };
  });
}
