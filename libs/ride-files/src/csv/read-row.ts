import { startInstant } from './start';
import type { CsvField, CsvMatching, CsvRide } from './matching';
import { parseDay, parseDistance, parseDuration } from './values';
import { surfaceOf, weatherOf, yesOrNo } from './words';
import type { CsvRow } from './table';

/** Longer than anyone rides in a day: a slipped unit or a running total, not a ride (common practice, no source). */
const MAX_RIDE_M = 2_000_000;

/** One row as a ride, or the plain sentence that says why it is none. */
export function readRow(row: CsvRow, matching: CsvMatching): CsvRide | string {
  const cell = (field: CsvField) => row.cells[matching.columns[field] ?? -1] ?? '';
  const date = parseDay(cell('date'), matching.dateOrder);
  if (date === null) return `“${shorten(cell('date'))}” is not a date in the order chosen.`;
  const distance = parseDistance(cell('distance'), matching.distanceUnit, matching.decimal);
  if (distance === null) return `“${shorten(cell('distance'))}” is not a distance.`;
  const distanceM = Math.round(distance);
  if (distanceM <= 0) return 'The distance is nothing: the row was left out.';
  if (distanceM > MAX_RIDE_M)
    return `${Math.round(distanceM / 1000)} km is too far for one ride: check the unit.`;
  const movingS = duration(cell('movingTime'), matching);
  const elapsedS = duration(cell('elapsedTime'), matching);
  if (movingS === undefined || elapsedS === undefined)
    return 'The time cannot be read: use hours:minutes:seconds.';
  const surface = surfaceOf(cell('surface'));
  const indoor = yesOrNo(cell('indoor')) ?? (surface === 'indoor' ? true : null);
  return {
    line: row.line,
    date,
    startedAt: startInstant(cell('startTime')) ?? startInstant(cell('date')),
    distanceM,
    movingS,
    elapsedS,
    sport: cell('sport') || null,
    indoor,
    surface: surface ?? (indoor ? 'indoor' : null),
    weather: weatherOf(cell('weather')),
  };
}

/** Whole seconds, null for an empty cell, undefined for one that cannot be read. */
function duration(text: string, matching: CsvMatching): number | null | undefined {
  if (text === '') return null;
  const seconds = parseDuration(text, matching.timeUnit, matching.decimal);
  return seconds === null || seconds < 0 || seconds > 7 * 86_400 ? undefined : Math.round(seconds);
}

const shorten = (text: string) => (text.length > 40 ? `${text.slice(0, 40)}…` : text);
