import { cellsOf, guessColumns, guessHeader } from './columns';
import { looksLikeDate, possibleOrders } from './days';
import { headerDistanceUnit, headerTimeUnit } from './headers';
import type { CsvMatching, CsvQuestion, Delimiter } from './matching';
import { questionsAbout } from './questions';
import { guessShortClock } from './short-clock';
import type { CsvRow } from './table';
import { looksLikeNumber, parseDistance, parseNumber, unitless } from './values';

/** What the rider has said already; everything else is guessed. Columns, once given, are all that count. */
export type KnownMatching = Partial<CsvMatching>;

/** Best guess at a matching, and what only the rider can decide. */
export function guessMatching(
  rows: CsvRow[],
  known: KnownMatching & { delimiter: Delimiter },
): { matching: CsvMatching; questions: CsvQuestion[] } {
  const hasHeader = known.hasHeader ?? guessHeader(rows);
  const header = hasHeader ? (rows[0]?.cells ?? []) : [];
  const body = hasHeader ? rows.slice(1) : rows;
  const columns = { ...(known.columns ?? guessColumns(header, body)) };
  const distances = cellsOf(body, columns.distance);
  const dates = cellsOf(body, columns.date).filter(looksLikeDate);
  const orders = known.dateOrder ? [known.dateOrder] : possibleOrders(dates);
  const { decimal, sure } = known.decimal ? { decimal: known.decimal, sure: true } : guessDecimal(distances);
  const unit =
    known.distanceUnit ?? headerDistanceUnit(header[columns.distance ?? -1] ?? '') ?? cellUnit(distances);
  const distanceUnit = unit ?? 'km';
  const guessedClock = guessShortClock(
    cellsOf(body, columns.movingTime).map((time, i) => ({
      time,
      distanceM: parseDistance(distances[i] ?? '', distanceUnit, decimal),
    })),
  );
  if (guessedClock === null && known.columns === undefined) moveToStart(columns);
  const timeUnit = known.timeUnit ?? headerTimeUnit(header[columns.movingTime ?? -1] ?? '');
  const questions = questionsAbout(columns, {
    header,
    ambiguousDate: orders.length > 1 ? dates[0] : undefined,
    decimalSure: sure,
    unitKnown: unit !== null,
    bareTimes: timeUnit === null && cellsOf(body, columns.movingTime).some(looksLikeNumber),
  });
  const matching: CsvMatching = {
    delimiter: known.delimiter,
    hasHeader,
    decimal,
    dateOrder: orders[0] ?? 'ymd',
    distanceUnit,
    timeUnit: timeUnit ?? 'min',
    shortClock: known.shortClock ?? guessedClock ?? 'h:m',
    columns,
  };
  return { matching, questions };
}

/** A column of times at which no bicycle rides tells the time of day. */
function moveToStart(columns: CsvMatching['columns']): void {
  if (columns.movingTime !== undefined) columns.startTime ??= columns.movingTime;
  delete columns.movingTime;
}

/** Decimal mark by evidence: '12,5' or '1.234,5' speak for a comma; '1,234' alone speaks for neither. */
export function guessDecimal(cells: string[]): { decimal: '.' | ','; sure: boolean } {
  const reads = (decimal: '.' | ',') =>
    cells.filter((cell) => parseNumber(unitless(cell), decimal) !== null).length;
  const comma = reads(',');
  const point = reads('.');
  if (comma !== point) return { decimal: comma > point ? ',' : '.', sure: true };
  return { decimal: '.', sure: !cells.some((cell) => /^\d{1,3},\d{3}$/.test(unitless(cell))) };
}

/** Unit written in every filled cell, or null. */
function cellUnit(cells: string[]): CsvMatching['distanceUnit'] | null {
  const filled = cells.filter((cell) => cell !== '');
  const units = new Set(filled.map((cell) => /\d\s*(km|mi|m)$/i.exec(cell)?.[1]?.toLowerCase() ?? ''));
  const [unit] = units;
  return units.size === 1 && unit ? (unit as CsvMatching['distanceUnit']) : null;
}
