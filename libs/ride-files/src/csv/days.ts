import type { DateOrder } from './matching';

const months = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];

/** Calendar day 'YYYY-MM-DD', or null when there is no such day. A year first, or a named month, needs no order. */
export function parseDay(text: string, order: DateOrder): string | null {
  const parts = /^(\d{1,4})[-/. ](\d{1,2})[-/. ](\d{1,4})(?:[T ,].*)?$/.exec(text) ?? compact(text);
  if (!parts) return namedMonth(text);
  const [a, b, c] = [String(parts[1]), String(parts[2]), String(parts[3])];
  if (a.length === 4) return day(a, b, c);
  return order === 'mdy' ? day(c, a, b) : order === 'dmy' ? day(c, b, a) : day(a, b, c);
}

/** A day in one order or another. */
export const looksLikeDate = (text: string) =>
  (['ymd', 'dmy', 'mdy'] as const).some((order) => parseDay(text, order) !== null);

/** Date orders under which the most cells are days; a cell with 13 or more decides, a year first asks nothing. */
export function possibleOrders(cells: string[]): DateOrder[] {
  const orders: DateOrder[] = ['dmy', 'mdy'];
  const open = cells.filter((cell) => /^\d{1,2}[-/. ]\d/.test(cell) && looksLikeDate(cell));
  if (open.length === 0) return ['ymd'];
  const fits = (order: DateOrder) => open.filter((cell) => parseDay(cell, order) !== null).length;
  const most = Math.max(...orders.map(fits));
  return orders.filter((order) => fits(order) === most);
}

const compact = (text: string) => /^((?:19|20)\d{2})(\d{2})(\d{2})$/.exec(text);

/** '3 May 2025', '03-May-25' or 'May 3, 2025', weekday or not. */
function namedMonth(text: string): string | null {
  const plain = text.replace(/^[a-z]{3,9}day,?\s+|^(?:mon|tue|wed|thu|fri|sat|sun)\.?,?\s+/i, '');
  const dayFirst = /^(\d{1,2})[-. ]+([a-z]{3,9})[-. ,]+(\d{4}|\d{2})(?:[T ,].*)?$/i.exec(plain);
  const monthFirst = /^([a-z]{3,9})[-. ]+(\d{1,2})[-. ,]+(\d{4})(?:[T ,].*)?$/i.exec(plain);
  const month = (dayFirst?.[2] ?? monthFirst?.[1] ?? '').slice(0, 3).toLowerCase();
  if (!months.includes(month)) return null;
  return day(
    dayFirst?.[3] ?? monthFirst?.[3] ?? '',
    String(months.indexOf(month) + 1),
    dayFirst?.[1] ?? monthFirst?.[2] ?? '',
  );
}

function day(year: string, month: string, date: string): string | null {
  if (date.length > 2 || year.length === 3 || year.length === 1) return null;
  const full = year.length === 2 ? `20${year}` : year;
  const iso = `${full}-${month.padStart(2, '0')}-${date.padStart(2, '0')}`;
  const check = new Date(`${iso}T00:00:00Z`);
  return Number.isNaN(check.getTime()) || check.toISOString().slice(0, 10) !== iso ? null : iso;
}
