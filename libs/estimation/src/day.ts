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

/** Month of a day, 0 = January. */
export function monthOf(day: Day): number {
  return new Date(day * MS_A_DAY).getUTCMonth();
}
