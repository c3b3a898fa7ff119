import { distanceWords } from './words';
import type { FileRide, Outcome, RideFileResult } from './types';

/** A whole file in one line: what most matters of its results, and sums over its rides. */
export interface FileSummary {
  file: string;
  outcome: Outcome;
  date: string | null;
  /** Metres, over all rides of the file. */
  distanceM: number | null;
  movingS: number | null;
  elapsedS: number | null;
  message: string;
}

const rank: Outcome[] = ['ride', 'other-sport', 'not-a-ride', 'unreadable'];

/** Sums up what a file gave: rides before other sports before nothing. Times are null when no ride tells them. */
export function summariseFile(file: string, results: readonly RideFileResult[]): FileSummary {
  const outcome = rank.find((one) => results.some((result) => result.outcome === one)) ?? 'unreadable';
  const chosen = results.filter((result) => result.outcome === outcome);
  const rides = chosen.flatMap(({ ride }) => (ride ? [ride] : []));
  const lengths = chosen.flatMap(({ ride, untimedM }) => ride?.distanceM ?? untimedM ?? []);
  return {
    file,
    outcome,
    date: rides.map(({ date }) => date).sort()[0] ?? null,
    distanceM: sum(lengths),
    movingS: sum(rides.flatMap(({ movingS }) => movingS ?? [])),
    elapsedS: span(rides),
    message: message(results, chosen),
  };
}

const sum = (values: number[]) => (values.length === 0 ? null : values.reduce((a, b) => a + b, 0));

/** Seconds from the first start to the last finish where all starts are known, else the sum. */
function span(rides: FileRide[]): number | null {
  const times = rides.flatMap(({ startedAt, elapsedS }) =>
    startedAt === null || elapsedS === null ? [] : [[Date.parse(startedAt) / 1000, elapsedS] as const],
  );
  if (rides.length < 2 || times.length < rides.length)
    return sum(rides.flatMap(({ elapsedS }) => elapsedS ?? []));
  const finish = Math.max(...times.map(([start, elapsed]) => start + elapsed));
  return Math.round(finish - Math.min(...times.map(([start]) => start)));
}

function message(results: readonly RideFileResult[], chosen: RideFileResult[]): string {
  const first = chosen[0]?.message ?? 'The file holds nothing.';
  const others = results.length - chosen.length;
  const left = others > 0 ? ` ${others} more ${others === 1 ? 'was' : 'were'} left out.` : '';
  if (chosen.length <= 1) return `${first}${left}`;
  if (chosen[0]?.outcome !== 'ride') return `${chosen.length} recordings. The first: ${first}${left}`;
  const metres = sum(chosen.map(({ ride }) => ride?.distanceM ?? 0)) ?? 0;
  return `${chosen.length} rides, ${distanceWords(metres)} in all.${left}`;
}
