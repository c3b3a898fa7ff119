import { looksLikeDate } from './days';
import type { Delimiter } from './matching';
import { splitRows, type CsvRow } from './table';

const delimiters: Delimiter[] = [',', ';', '\t', '|'];

/** The delimiter under which the first rows show dates in cells of their own and have evenly many columns. */
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

/**
 * Share of rows with a date in a cell of its own, which weighs most, and columns of the first row times the
 * share of rows that have as many. 0 when there is one column only.
 */
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
  const dated = rows.filter((row) => row.cells.some(looksLikeDate)).length / rows.length;
  return 100 * dated + (even >= 0.8 ? width * even : even);
}
