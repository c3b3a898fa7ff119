import { parse } from 'csv-parse/sync';
import type { Delimiter } from './matching';
import { decodeText } from '../text';
import { UnreadableFile } from '../unreadable';

export interface CsvRow {
  line: number;
  cells: string[];
}

export const MAX_CSV_ROWS = 200_000;
const MAX_ROW_CHARS = 20_000;
const delimiters: Delimiter[] = [',', ';', '\t', '|'];

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
    return rows.map(({ record, info }) => ({ line: info.lines, cells: record }));
  } catch {
    throw new UnreadableFile(
      'The table breaks off inside a quoted cell or has a row that is far too long: save it again as CSV.',
    );
  }
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

/** The delimiter that cuts the first rows into the most columns, the same number on nearly every row. */
export function guessDelimiter(text: string): Delimiter {
  const head = text.slice(0, 65_536);
  const sample = text.length > head.length ? head.slice(0, head.lastIndexOf('\n') + 1) || head : head;
  let best: Delimiter = ',';
  let bestScore = 0;
  for (const delimiter of delimiters) {
    const score = evenness(sample, delimiter);
    if (score > bestScore) [best, bestScore] = [delimiter, score];
  }
  return best;
}

/** Columns of the header times the share of rows that have as many: 0 when there is one column only. */
function evenness(sample: string, delimiter: Delimiter): number {
  let rows: CsvRow[];
  try {
    rows = splitRows(sample, delimiter, 50);
  } catch {
    return 0;
  }
  const width = rows[0]?.cells.length ?? 0;
  if (width < 2) return 0;
  const even = rows.filter((row) => row.cells.length === width).length / rows.length;
  return even >= 0.8 ? width * even : even;
}
