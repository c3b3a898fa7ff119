import type { CsvMatching, CsvQuestion } from './matching';

/** What the file itself leaves open, beside the columns that were found. */
export interface Doubts {
  header: string[];
  /** A date of the file that could be day or month first; undefined when the order is known. */
  ambiguousDate: string | undefined;
  decimalSure: boolean;
  unitKnown: boolean;
  bareTimes: boolean;
}

/** The questions that only the rider can answer, fewest possible. */
export function questionsAbout(columns: CsvMatching['columns'], doubts: Doubts): CsvQuestion[] {
  const questions: CsvQuestion[] = [];
  const ask = (about: CsvQuestion['about'], text: string, ...choices: string[]) =>
    questions.push({ about, text, choices });
  if (columns.date === undefined) ask('date', 'Which column holds the date?', ...doubts.header);
  if (columns.distance === undefined) ask('distance', 'Which column holds the distance?', ...doubts.header);
  if (doubts.ambiguousDate !== undefined) {
    ask('dateOrder', `Is “${doubts.ambiguousDate}” day first or month first?`, 'dmy', 'mdy');
  }
  if (columns.distance === undefined) return questions;
  if (!doubts.decimalSure) {
    ask('decimal', 'Is the comma in the distances a decimal comma or does it part the thousands?', ',', '.');
  }
  if (!doubts.unitKnown)
    ask('distanceUnit', 'Are the distances in kilometres, miles or metres?', 'km', 'mi', 'm');
  if (doubts.bareTimes) ask('timeUnit', 'Are the times in seconds, minutes or hours?', 's', 'min', 'h');
  return questions;
}
