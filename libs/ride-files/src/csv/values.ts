import type { DateOrder, DistanceUnit, TimeUnit } from './matching';

/** Metres in one unit; 1 mile = 1609.344 m exactly (international yard and pound agreement 1959; memory). */
export const metresIn: Record<DistanceUnit, number> = { km: 1000, mi: 1609.344, m: 1 };
const secondsIn: Record<TimeUnit, number> = { s: 1, min: 60, h: 3600 };

/** Number with the given decimal mark; thousands marks (the other one, spaces, apostrophes) are dropped. */
export function parseNumber(text: string, decimal: '.' | ','): number | null {
  const plain = text.replace(/[\s'’\u00a0\u202f]/g, '');
  const grouped = decimal === '.' ? /^[+-]?\d{1,3}(,\d{3})+(\.\d+)?$/ : /^[+-]?\d{1,3}(\.\d{3})+(,\d+)?$/;
  const simple = decimal === '.' ? /^[+-]?(\d+\.?\d*|\.\d+)$/ : /^[+-]?(\d+,?\d*|,\d+)$/;
  if (!grouped.test(plain) && !simple.test(plain)) return null;
  const digits = decimal === '.' ? plain.replaceAll(',', '') : plain.replaceAll('.', '').replace(',', '.');
  return Number(digits);
}

/** Distance in metres; a unit written in the cell ('12 mi') goes before the column's unit. */
export function parseDistance(text: string, unit: DistanceUnit, decimal: '.' | ','): number | null {
  const written = /^(.*\d)\s*(km|mi|m)$/i.exec(text);
  const value = parseNumber(written?.[1] ?? text, decimal);
  if (value === null) return null;
  return value * metresIn[(written?.[2]?.toLowerCase() as DistanceUnit | undefined) ?? unit];
}

/** Seconds from '1:23:45', '1:23' (hours and minutes), '1h 23m 45s' or a plain number in the given unit. */
export function parseDuration(text: string, unit: TimeUnit, decimal: '.' | ','): number | null {
  const clock = /^(\d{1,3}):([0-5]\d)(?::([0-5]\d)(?:[.,]\d+)?)?$/.exec(text);
  if (clock) return Number(clock[1]) * 3600 + Number(clock[2]) * 60 + Number(clock[3] ?? 0);
  const worded =
    /^(?:(\d+)\s*h(?:rs?|ours?)?)?\s*(?:(\d+)\s*m(?:in(?:utes?|s)?)?)?\s*(?:(\d+)\s*s(?:ec(?:onds?|s)?)?)?$/i.exec(
      text,
    );
  if (text !== '' && worded) {
    return Number(worded[1] ?? 0) * 3600 + Number(worded[2] ?? 0) * 60 + Number(worded[3] ?? 0);
  }
  const value = parseNumber(text, decimal);
  return value === null ? null : value * secondsIn[unit];
}

/** Calendar day 'YYYY-MM-DD', or null when there is no such day. A year first is always year, month, day. */
export function parseDay(text: string, order: DateOrder): string | null {
  const parts = /^(\d{1,4})[-/. ](\d{1,2})[-/. ](\d{1,4})(?:[T ,].*)?$/.exec(text) ?? compact(text);
  if (!parts) return null;
  const [a, b, c] = [String(parts[1]), String(parts[2]), String(parts[3])];
  if (a.length === 4) return day(a, b, c);
  return order === 'mdy' ? day(c, a, b) : order === 'dmy' ? day(c, b, a) : day(a, b, c);
}

const compact = (text: string) => /^((?:19|20)\d{2})(\d{2})(\d{2})$/.exec(text);

function day(year: string, month: string, date: string): string | null {
  if (date.length > 2 || year.length === 3 || year.length === 1) return null;
  const full = year.length === 2 ? `20${year}` : year;
  const iso = `${full}-${month.padStart(2, '0')}-${date.padStart(2, '0')}`;
  const check = new Date(`${iso}T00:00:00Z`);
  return Number.isNaN(check.getTime()) || check.toISOString().slice(0, 10) !== iso ? null : iso;
}
