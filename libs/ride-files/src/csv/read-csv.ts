import { guessMatching } from './guess';
import type { CsvInspection, CsvMatching, CsvReading } from './matching';
import { readRow } from './read-row';
import { csvText, guessDelimiter, MAX_CSV_ROWS, splitRows, type CsvRow } from './table';
import { UnreadableFile } from '../unreadable';

const PREVIEW_ROWS = 8;

/**
 * Looks at a CSV without saving anything: guessed matching, what must be asked, a preview and the problems.
 * @throws UnreadableFile with a plain sentence
 */
export function inspectCsv(bytes: Uint8Array): CsvInspection {
  const text = csvText(bytes);
  const delimiter = guessDelimiter(text);
  const rows = limited(splitRows(text, delimiter));
  const { matching, questions } = guessMatching(rows, delimiter);
  const body = matching.hasHeader ? rows.slice(1) : rows;
  if (body.length === 0)
    throw new UnreadableFile('The file holds no rows: export it again with at least one ride.');
  const { rides, problems } = readRows(body, matching);
  const preview = body.slice(0, PREVIEW_ROWS);
  const last = preview.at(-1)?.line ?? 0;
  const width = Math.max(...rows.slice(0, 50).map((row) => row.cells.length));
  return {
    matching,
    questions,
    columns: Array.from({ length: width }, (_, index) => ({
      index,
      header: matching.hasHeader ? (rows[0]?.cells[index] ?? '') : `Column ${index + 1}`,
      samples: preview.map((row) => row.cells[index] ?? ''),
    })),
    preview,
    rides: rides.filter((ride) => ride.line <= last),
    problems,
    rows: body.length,
  };
}

/**
 * Reads every row of a CSV as a ride; a row that cannot be read becomes a problem and harms no other.
 * Without a matching the guess is used, ambiguous or not: check inspectCsv's questions first.
 * @throws UnreadableFile with a plain sentence
 */
export function readCsv(bytes: Uint8Array, matching?: CsvMatching): CsvReading {
  const text = csvText(bytes);
  const delimiter = matching?.delimiter ?? guessDelimiter(text);
  const rows = limited(splitRows(text, delimiter));
  const chosen = matching ?? guessMatching(rows, delimiter).matching;
  return readRows(chosen.hasHeader ? rows.slice(1) : rows, chosen);
}

function readRows(rows: CsvRow[], matching: CsvMatching): CsvReading {
  const reading: CsvReading = { rides: [], problems: [] };
  for (const row of rows) {
    const ride = readRow(row, matching);
    if (typeof ride === 'string') reading.problems.push({ line: row.line, message: ride });
    else reading.rides.push(ride);
  }
  return reading;
}

function limited(rows: CsvRow[]): CsvRow[] {
  if (rows.length > MAX_CSV_ROWS) {
    throw new UnreadableFile(`The table has more than ${MAX_CSV_ROWS} rows: cut it into smaller files.`);
  }
  return rows;
}
