import { ImpossibleInputError } from './errors';
import type { Day } from './types';

const MS_A_DAY = 86_400_000;

/** Whole days since 1970-01-01 of a calendar day 'YYYY-MM-DD'. @throws ImpossibleInputError */
export function dayOf(iso: string): Day {
  const ms = Date.parse(`${iso}T00:00:00Z`);
  if (!/^\d{4}-\d{2}-\d{2}$/.test(iso) || Number.isNaN(ms))
    throw new ImpossibleInputError(`${iso} is no calendar day.`);
  return Math.round(ms / MS_A_DAY);
}

/** 'YYYY-MM-DD' of whole days since 1970-01-01. */
export function isoDay(day: Day): string {
  return new Date(day * MS_A_DAY).toISOString().slice(0, 10);
}

/** Month of a day, 0 = January, by whole numbers alone (H. Hinnant, chrono-compatible date algorithms; memory). */
export function monthOf(day: Day): number {
  const shifted = Math.floor(day) + 719_468;
  const ofEra = shifted - Math.floor(shifted / 146_097) * 146_097;
  const year = Math.floor(
    (ofEra - Math.floor(ofEra / 1460) + Math.floor(ofEra / 36_524) - Math.floor(ofEra / 146_096)) / 365,
  );
  const ofYear = ofEra - (365 * year + Math.floor(year / 4) - Math.floor(year / 100));
  const month = Math.floor((5 * ofYear + 2) / 153);
  return month < 10 ? month + 2 : month - 10;
}
