import { parse } from 'csv-parse/sync';
import type { Delimiter } from './matching';
import { decodeText } from '../text';
import { UnreadableFile } from '../unreadable';

export interface CsvRow {
  line: number;
  cells: string[];
}

export const MAX_CSV_ROWS = 100_000;
const MAX_ROW_CHARS = 20_000;

/** Splits text into rows; throws UnreadableFile with a plain sentence when it cannot. */
export function splitRows(text: string, delimiter: Delimiter, limit = MAX_CSV_ROWS + 1): CsvRow[] {
  const options = {
    delimiter,
    bom: true,
    trim: true,
    info: true as const,
    relax_column_count: true,
    relax_quotes: true,
    skip_empty_lines: true,
    skip_records_with_all_empty_values: true,
    max_record_size: MAX_ROW_CHARS,
    to: limit,
  };
  try {
    const rows = parse(text, options) as unknown as { record: string[]; info: { lines: number } }[];
    return withoutTitle(rows.map(({ record, info }) => ({ line: info.lines, cells: record })));
  } catch {
    throw new UnreadableFile(
      'The table breaks off inside a quoted cell or has a row that is far too long: save it again as CSV.',
    );
  }
}

/** Drops lines above the table that fill one cell only, such as a title, where the table has more columns. */
function withoutTitle(rows: CsvRow[]): CsvRow[] {
  const filled = (row: CsvRow) => row.cells.filter((cell) => cell !== '').length;
  const first = rows.slice(0, 10).findIndex((row) => filled(row) >= 2);
  return first > 0 ? rows.slice(first) : rows;
}

/** Bytes of a CSV as text; a picture or a spreadsheet file is refused with a plain sentence. */
export function csvText(bytes: Uint8Array): string {
  const text = decodeText(bytes);
  if (text.slice(0, 4096).includes('\0')) {
    throw new UnreadableFile(
      'This is not a text table: export it from the spreadsheet as CSV and try again.',
    );
  }
  return text;
}
