import type { ActivityMesg, SessionMesg } from '@garmin/fitsdk';
import { judge, type Recording } from '../recording';
import type { RideFileResult } from '../types';
import { UnreadableFile } from '../unreadable';
import { decodeFit, type FitContents } from './decode';

/** Seconds from 1970 to the start of FIT time, 1989-12-31T00:00:00Z (FIT protocol; memory). */
const FIT_EPOCH_S = 631_065_600;
const DAMAGED = 'The file is damaged or breaks off: check the figures, or copy it from the device again.';

/**
 * Reads a FIT file: one result for each session.
 * @throws UnreadableFile with a plain sentence
 */
export function readFit(file: string, bytes: Uint8Array, timeZone?: string): RideFileResult[] {
  const contents = decodeFit(bytes);
  const sessions = distinct(contents.sessions);
  if (sessions.length === 0) return [withoutSession(file, contents)];
  const results: RideFileResult[] = [];
  for (const session of sessions) {
    const recording = toRecording(session, contents, sessions.length === 1);
    if (recording) results.push(judge(recording, { file, format: 'fit', timeZone, unnamedIsRide: false }));
  }
  if (results.length === 0)
    throw new UnreadableFile('The file does not say when it was recorded: log the ride by hand.');
  return results;
}

/** A recording chained twice into one file counts once. */
function distinct(sessions: SessionMesg[]): SessionMesg[] {
  const key = (one: SessionMesg) =>
    [one.startTime?.valueOf(), one.sport, one.subSport, one.totalDistance].join();
  return [...new Map(sessions.map((one) => [key(one), one])).values()];
}

function toRecording(session: SessionMesg, contents: FitContents, only: boolean): Recording | null {
  const [activity] = contents.activities;
  const start =
    milliseconds(session.startTime) ?? milliseconds(session.timestamp) ?? milliseconds(activity?.timestamp);
  if (start === null) return null;
  const named = [session.sport, session.subSport].filter((word) => word !== undefined);
  return {
    start,
    zoned: true,
    offsetS: localOffset(contents.activities),
    distanceM: session.totalDistance || (only ? contents.countedM : 0),
    movingS: session.totalTimerTime ?? session.totalMovingTime ?? null,
    elapsedS: session.totalElapsedTime ?? null,
    sport: named.length > 0 ? named.join('/') : null,
    cautions: contents.whole ? [] : [DAMAGED],
  };
}

const milliseconds = (time: unknown): number | null => (time instanceof Date ? time.getTime() : null);

/** Seconds from UTC to the device's wall clock, null when it does not keep one. */
function localOffset(activities: ActivityMesg[]): number | null {
  for (const { timestamp, localTimestamp } of activities) {
    const utc = milliseconds(timestamp);
    if (utc === null || !localTimestamp) continue;
    const offset = Number(localTimestamp) + FIT_EPOCH_S - utc / 1000;
    if (Math.abs(offset) <= 14 * 3600) return Math.round(offset / 900) * 900;
  }
  return null;
}

const kindNames: Record<string, string> = {
  workout: 'a workout plan',
  course: 'a planned course',
  settings: 'a device’s settings',
  weight: 'weighings',
  monitoringA: 'a day’s monitoring',
  monitoringB: 'a day’s monitoring',
  monitoringDaily: 'a day’s monitoring',
};

function withoutSession(file: string, { kinds, whole }: FitContents): RideFileResult {
  const [kind = 'unknown'] = kinds;
  if (kind !== 'activity' && whole) {
    const message = `The file holds ${kindNames[kind] ?? 'something else'}, not a ride: send the recording of the ride.`;
    return { file, format: 'fit', outcome: 'not-a-ride', ride: null, message };
  }
  throw new UnreadableFile(
    'The recording is damaged or breaks off before its summary: copy it from the device again.',
  );
}
