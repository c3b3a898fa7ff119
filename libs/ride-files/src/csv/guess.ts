import { headerDistanceUnit, headerTimeUnit, matchHeaders } from './headers';
import type { CsvMatching, CsvQuestion, DateOrder, Delimiter } from './matching';
import type { CsvRow } from './table';
import { parseDay, parseNumber } from './values';

/** A day in one order or another. */
export const looksLikeDate = (text: string) =>
  parseDay(text, 'ymd') !== null || parseDay(text, 'dmy') !== null || parseDay(text, 'mdy') !== null;

const looksLikeNumber = (text: string) => parseNumber(text, '.') !== null || parseNumber(text, ',') !== null;

/** A first row in which no cell is a date or a number is a header. */
export function guessHeader(rows: CsvRow[]): boolean {
  const first = rows[0]?.cells ?? [];
  return !first.some((cell) => looksLikeDate(cell) || looksLikeNumber(cell));
}

/** Date orders under which the most cells are days; a cell with 13 or more decides, a year first asks nothing. */
export function possibleOrders(cells: string[]): DateOrder[] {
  const orders: DateOrder[] = ['ymd', 'dmy', 'mdy'];
  const filled = cells.filter(looksLikeDate);
  const fits = (order: DateOrder) => filled.filter((cell) => parseDay(cell, order) !== null).length;
  if (filled.every((cell) => /^\d{4}/.test(cell))) return ['ymd'];
  const most = Math.max(...orders.map(fits));
  return orders.filter((order) => order !== 'ymd' && fits(order) === most);
}

/** Decimal mark by evidence: '12,5' or '1.234,5' speak for a comma; '1,234' alone speaks for neither. */
export function guessDecimal(cells: string[]): { decimal: '.' | ','; sure: boolean } {
  const reads = (decimal: '.' | ',') =>
    cells.filter((cell) => parseNumber(unitless(cell), decimal) !== null).length;
  const comma = reads(',');
  const point = reads('.');
  if (comma !== point) return { decimal: comma > point ? ',' : '.', sure: true };
  return { decimal: '.', sure: !cells.some((cell) => /^\d{1,3},\d{3}$/.test(cell)) };
}

const unitless = (cell: string) => cell.replace(/\s*(km|mi|m)$/i, '');

/** Best guess at a matching, and what only the rider can decide. */
export function guessMatching(
  rows: CsvRow[],
  delimiter: Delimiter,
): { matching: CsvMatching; questions: CsvQuestion[] } {
  const hasHeader = guessHeader(rows);
  const header = hasHeader ? (rows[0]?.cells ?? []) : [];
  const body = hasHeader ? rows.slice(1) : rows;
  const columns = hasHeader ? matchHeaders(header) : {};
  const column = (index: number | undefined) => body.map((row) => row.cells[index ?? -1] ?? '');
  columns.date ??= soleColumn(body, looksLikeDate);
  if (!hasHeader)
    columns.distance ??= soleColumn(body, (cell) => looksLikeNumber(unitless(cell)) && !looksLikeDate(cell));
  const orders = possibleOrders(column(columns.date));
  const { decimal, sure } = guessDecimal(column(columns.distance).filter((cell) => cell !== ''));
  const unit = headerDistanceUnit(header[columns.distance ?? -1] ?? '') ?? cellUnit(column(columns.distance));
  const timeUnit = headerTimeUnit(header[columns.movingTime ?? -1] ?? '');
  const bareTimes = column(columns.movingTime).some((cell) => looksLikeNumber(cell));
  const questions: CsvQuestion[] = [];
  const ask = (about: CsvQuestion['about'], text: string, ...choices: string[]) =>
    questions.push({ about, text, choices });
  if (columns.date === undefined) ask('date', 'Which column holds the date?', ...header);
  if (columns.distance === undefined) ask('distance', 'Which column holds the distance?', ...header);
  if (columns.date !== undefined && orders.length > 1) {
    ask(
      'dateOrder',
      `Is “${column(columns.date).find((cell) => cell !== '') ?? ''}” day first or month first?`,
      'dmy',
      'mdy',
    );
  }
  if (!sure)
    ask('decimal', 'Is the comma in the distances a decimal comma or does it part the thousands?', ',', '.');
  if (columns.distance !== undefined && unit === null)
    ask('distanceUnit', 'Are the distances in kilometres, miles or metres?', 'km', 'mi', 'm');
  if (bareTimes && timeUnit === null)
    ask('timeUnit', 'Are the times in seconds, minutes or hours?', 's', 'min', 'h');
  const matching: CsvMatching = {
    delimiter,
    hasHeader,
    decimal,
    dateOrder: orders[0] ?? 'ymd',
    distanceUnit: unit ?? 'km',
    timeUnit: timeUnit ?? 'min',
    columns,
  };
  return { matching, questions };
}

/** The one column in which nine filled cells of ten pass; undefined when none or several do. */
function soleColumn(body: CsvRow[], test: (cell: string) => boolean): number | undefined {
  const width = Math.max(0, ...body.slice(0, 50).map((row) => row.cells.length));
  const fitting = Array.from({ length: width }, (_, index) => index).filter((index) => {
    const cells = body.map((row) => row.cells[index] ?? '').filter((cell) => cell !== '');
    return cells.length > 0 && cells.filter(test).length >= 0.9 * cells.length;
  });
  return fitting.length === 1 ? fitting[0] : undefined;
}

/** Unit written in every filled cell, or null. */
function cellUnit(cells: string[]): CsvMatching['distanceUnit'] | null {
  const filled = cells.filter((cell) => cell !== '');
  const units = new Set(filled.map((cell) => /\d\s*(km|mi|m)$/i.exec(cell)?.[1]?.toLowerCase() ?? ''));
  const [unit] = units;
  return units.size === 1 && unit ? (unit as CsvMatching['distanceUnit']) : null;
}
