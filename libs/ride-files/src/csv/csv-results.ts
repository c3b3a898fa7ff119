import type { RideFileResult } from '../types';
import { UnreadableFile } from '../unreadable';
import { distanceWords } from '../words';
import type { CsvMatching, CsvRide } from './matching';
import { examineCsv } from './read-csv';

/**
 * A CSV as results, in the order of its lines. When only the rider can tell how its columns are meant,
 * there is one result with needsMatching set.
 * @throws UnreadableFile with a plain sentence
 */
export function csvResults(file: string, bytes: Uint8Array, matching?: CsvMatching): RideFileResult[] {
  const { matching: used, questions, rides, problems } = examineCsv(bytes, matching);
  if (questions.length > 0) {
    if (used.columns.date === undefined && used.columns.distance === undefined) {
      throw new UnreadableFile(
        'The table has no column that looks like a date and a distance: send a table of rides.',
      );
    }
    const message = `Match the columns first. ${questions.map(({ text }) => text).join(' ')}`;
    return [{ file, format: 'csv', outcome: 'unreadable', ride: null, message, needsMatching: true }];
  }
  const results: RideFileResult[] = [
    ...rides.map((ride) => rideResult(file, ride)),
    ...problems.map(({ line, outcome, message }) => ({
      file,
      format: 'csv' as const,
      outcome,
      ride: null,
      message,
      line,
    })),
  ];
  return results.sort((a, b) => (a.line ?? 0) - (b.line ?? 0));
}

function rideResult(file: string, { line, ...ride }: CsvRide): RideFileResult {
  const message = `A ride of ${distanceWords(ride.distanceM)} on ${ride.date}.`;
  return { file, format: 'csv', outcome: 'ride', ride, message, line };
}
