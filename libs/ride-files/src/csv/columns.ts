import { looksLikeDate } from './days';
import { matchHeaders } from './headers';
import type { CsvMatching } from './matching';
import type { CsvRow } from './table';
import { looksLikeNumber, unitless } from './values';

/** A first row in which no cell is a date or a number is a header. */
export function guessHeader(rows: CsvRow[]): boolean {
  const first = rows[0]?.cells ?? [];
  return !first.some((cell) => looksLikeDate(cell) || looksLikeNumber(cell));
}

/** Columns by their headers; the date also by its looks, and the distance where there are no headers. */
export function guessColumns(header: string[], body: CsvRow[]): CsvMatching['columns'] {
  const columns = matchHeaders(header);
  const named = columns.date === undefined ? [] : cellsOf(body, columns.date).filter((cell) => cell !== '');
  if (named.length > 0 && !named.some(looksLikeDate)) delete columns.date;
  const date = columns.date ?? soleColumn(body, looksLikeDate);
  if (date !== undefined) columns.date = date;
  if (header.length === 0) {
    const distance = soleColumn(body, (cell) => looksLikeNumber(unitless(cell)) && !looksLikeDate(cell));
    if (distance !== undefined) columns.distance = distance;
  }
  return columns;
}

/** Cells of one column; empty ones where a row is short or the column is not there. */
export const cellsOf = (body: CsvRow[], index: number | undefined) =>
  body.map((row) => row.cells[index ?? -1] ?? '');

/** The one column in which nine filled cells of ten pass; undefined when none or several do. */
function soleColumn(body: CsvRow[], test: (cell: string) => boolean): number | undefined {
  const width = Math.max(0, ...body.slice(0, 50).map((row) => row.cells.length));
  const fitting = Array.from({ length: width }, (_, index) => index).filter((index) => {
    const cells = cellsOf(body, index).filter((cell) => cell !== '');
    return cells.length > 0 && cells.filter(test).length >= 0.9 * cells.length;
  });
  return fitting.length === 1 ? fitting[0] : undefined;
}
