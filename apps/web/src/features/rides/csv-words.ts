import type { CsvField, CsvMatching, CsvQuestion } from '@halfpitch/ride-files';

/** What the answers about a table are called. */
export const delimiterWords: Record<CsvMatching['delimiter'], string> = {
  ',': 'Comma',
  ';': 'Semicolon',
  '\t': 'Tab',
  '|': 'Upright bar',
};
export const decimalWords: Record<CsvMatching['decimal'], string> = { '.': '12.5', ',': '12,5' };
export const orderWords: Record<CsvMatching['dateOrder'], string> = {
  ymd: 'Year first',
  dmy: 'Day first',
  mdy: 'Month first',
};
export const distanceWords: Record<CsvMatching['distanceUnit'], string> = {
  km: 'Kilometres',
  mi: 'Miles',
  m: 'Metres',
};
export const timeWords: Record<CsvMatching['timeUnit'], string> = {
  s: 'Seconds',
  min: 'Minutes',
  h: 'Hours',
};
export const clockWords: Record<CsvMatching['shortClock'], string> = {
  'h:m': 'Hours and minutes',
  'm:s': 'Minutes and seconds',
};
export const fieldWords: Record<CsvField, string> = {
  date: 'Date',
  distance: 'Distance',
  movingTime: 'Moving time',
  elapsedTime: 'Time from start to end',
  startTime: 'Start',
  sport: 'Sport',
  surface: 'Ground',
  weather: 'Weather',
  indoor: 'Indoors',
};

/** What is certain of how a table is read: 'Semicolon between columns, decimals as 12,5, dates day first, kilometres.' */
export function matchingWords(
  { delimiter, decimal, dateOrder, distanceUnit }: CsvMatching,
  questions: readonly Pick<CsvQuestion, 'about'>[] = [],
): string {
  const open = new Set(questions.map(({ about }) => about));
  const known = !open.has('distance');
  const parts = [
    `${delimiterWords[delimiter]} between columns`,
    known && !open.has('decimal') && `decimals as ${decimalWords[decimal]}`,
    !open.has('date') && !open.has('dateOrder') && `dates ${orderWords[dateOrder].toLowerCase()}`,
    known && !open.has('distanceUnit') && distanceWords[distanceUnit].toLowerCase(),
  ];
  return `${parts.filter(Boolean).join(', ')}.`;
}
