import { guessDelimiter } from './delimiter';
import { guessMatching, type KnownMatching } from './guess';
import type { CsvInspection, CsvMatching, CsvQuestion, CsvReading } from './matching';
import { readRow } from './read-row';
import { csvText, MAX_CSV_ROWS, splitRows, type CsvRow } from './table';
import { UnreadableFile } from '../unreadable';

const PREVIEW_ROWS = 8;

/** A CSV read once, with the guess or the matching given. */
export interface ExaminedCsv extends CsvReading {
  matching: CsvMatching;
  questions: CsvQuestion[];
  header: string[];
  body: CsvRow[];
}

/** Reads a CSV, guessing what was not said; throws UnreadableFile with a plain sentence when it holds no table. */
export function examineCsv(bytes: Uint8Array, given: KnownMatching = {}): ExaminedCsv {
  const text = csvText(bytes);
  const delimiter = given.delimiter ?? guessDelimiter(text);
  const rows = splitRows(text, delimiter);
  if (rows.length > MAX_CSV_ROWS) {
    throw new UnreadableFile(`The table has more than ${MAX_CSV_ROWS} rows: cut it into smaller files.`);
  }
  const { matching, questions } = guessMatching(rows, { ...given, delimiter });
  const header = matching.hasHeader ? (rows[0]?.cells ?? []) : [];
  const body = matching.hasHeader ? rows.slice(1) : rows;
  if (body.length === 0)
    throw new UnreadableFile('The file holds no rows: export it again with at least one ride.');
  return { matching, questions, header, body, ...readRows(body, matching) };
}

/**
 * Looks at a CSV without saving anything: guessed matching, what must be asked, a preview and the problems.
 * Given a matching, or what the rider has said of it so far, it shows what that would make of the file.
 * @throws UnreadableFile with a plain sentence
 */
export function inspectCsv(bytes: Uint8Array, given?: KnownMatching): CsvInspection {
  const { matching, questions, header, body, rides, problems } = examineCsv(bytes, given);
  const preview = body.slice(0, PREVIEW_ROWS);
  const last = preview.at(-1)?.line ?? 0;
  const width = Math.max(header.length, ...body.slice(0, 50).map((row) => row.cells.length));
  return {
    matching,
    questions,
    columns: Array.from({ length: width }, (_, index) => ({
      index,
      header: header[index] || `Column ${index + 1}`,
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
  const { rides, problems } = examineCsv(bytes, matching);
  return { rides, problems };
}

function readRows(rows: CsvRow[], matching: CsvMatching): CsvReading {
  const reading: CsvReading = { rides: [], problems: [] };
  for (const row of rows) {
    const ride = readRow(row, matching);
    if ('message' in ride) reading.problems.push(ride);
    else reading.rides.push(ride);
  }
  return reading;
}
