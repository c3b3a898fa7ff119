import { startInstant } from './start';
import type { CsvField, CsvMatching, CsvProblem, CsvRide } from './matching';
import { parseDay } from './days';
import { parseDistance, parseDuration } from './values';
import { surfaceOf, weatherOf, yesOrNo } from './words';
import type { CsvRow } from './table';
import { isCycling, isIndoor } from '../sport';

/** Longer than anyone rides in a day: a slipped unit or a running total, not a ride (common practice, no source). */
const MAX_RIDE_M = 2_000_000;

/** One row as a ride, or the problem that says why it is none. */
export function readRow(row: CsvRow, matching: CsvMatching): CsvRide | CsvProblem {
  const problem = (message: string, outcome: CsvProblem['outcome'] = 'unreadable') => ({
    line: row.line,
    outcome,
    message,
  });
  const cell = (field: CsvField) => row.cells[matching.columns[field] ?? -1] ?? '';
  const date = parseDay(cell('date'), matching.dateOrder);
  if (date === null) return problem(`“${shorten(cell('date'))}” is not a date that can be read.`);
  const distance = parseDistance(cell('distance'), matching.distanceUnit, matching.decimal);
  if (distance === null) return problem(`“${shorten(cell('distance'))}” is not a distance.`);
  const distanceM = Math.round(distance);
  if (distanceM <= 0) return problem('The distance is nothing: the row was left out.', 'not-a-ride');
  if (distanceM > MAX_RIDE_M)
    return problem(`${Math.round(distanceM / 1000)} km is too far for one ride: check the unit.`);
  const sport = cell('sport') || null;
  if (isCycling(sport) === false)
    return problem(`“${shorten(cell('sport'))}” is another sport: the row was left out.`, 'other-sport');
  const movingS = duration(cell('movingTime'), matching);
  const elapsedS = duration(cell('elapsedTime'), matching);
  if (movingS === undefined || elapsedS === undefined)
    return problem('The time cannot be read: use hours:minutes:seconds.');
  const surface = surfaceOf(cell('surface'));
  const indoor = yesOrNo(cell('indoor')) ?? (surface === 'indoor' ? true : isIndoor(sport));
  return {
    line: row.line,
    date,
    startedAt: startInstant(cell('startTime')) ?? startInstant(cell('date')),
    distanceM,
    movingS,
    elapsedS,
    sport,
    indoor,
    surface: surface ?? (indoor ? 'indoor' : null),
    weather: weatherOf(cell('weather')),
  };
}

/** Whole seconds, null for an empty cell, undefined for one that cannot be read. */
function duration(text: string, matching: CsvMatching): number | null | undefined {
  if (text === '') return null;
  const seconds = parseDuration(text, matching.timeUnit, matching.decimal, matching.shortClock);
  return seconds === null || seconds < 0 || seconds > 7 * 86_400 ? undefined : Math.round(seconds);
}

const shorten = (text: string) => (text.length > 40 ? `${text.slice(0, 40)}…` : text);
