import type { DistanceUnit, ShortClock, TimeUnit } from './matching';

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

/** True when the text is a number with one decimal mark or the other. */
export const looksLikeNumber = (text: string) =>
  parseNumber(text, '.') !== null || parseNumber(text, ',') !== null;

/** '12,5 km' without its unit. */
export const unitless = (text: string) => text.replace(/\s*(km|mi|m)$/i, '');

/** Distance in metres; a unit written in the cell ('12 mi') goes before the column's unit. */
export function parseDistance(text: string, unit: DistanceUnit, decimal: '.' | ','): number | null {
  const written = /^(.*\d)\s*(km|mi|m)$/i.exec(text);
  const value = parseNumber(written?.[1] ?? text, decimal);
  if (value === null) return null;
  return value * metresIn[(written?.[2]?.toLowerCase() as DistanceUnit | undefined) ?? unit];
}

/** Seconds from '1:23:45', '1:23' (by shortClock), '1h 23m 45s' or a plain number in the given unit. */
export function parseDuration(
  text: string,
  unit: TimeUnit,
  decimal: '.' | ',',
  shortClock: ShortClock = 'h:m',
): number | null {
  const clock = /^(\d{1,3}):([0-5]\d)(?::([0-5]\d)(?:[.,]\d+)?)?$/.exec(text);
  if (clock && clock[3] === undefined && shortClock === 'm:s')
    return Number(clock[1]) * 60 + Number(clock[2]);
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
