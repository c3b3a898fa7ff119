import { judge } from '../recording';
import type { RideFileResult } from '../types';
import type { TcxActivity, TcxReader } from './tcx';

/** What a TCX file holds, once it has streamed through its reader. */
export function tcxResults(reader: TcxReader, file: string, timeZone: string | undefined): RideFileResult[] {
  if (reader.activities.length === 0) return [without(file, emptySentence(reader))];
  return reader.activities.map((activity) => {
    if (activity.laps === 0) return without(file, 'The activity has no laps: there is no ride to count.');
    if (!activity.start) {
      return without(file, 'The activity does not say when it was: log the ride by hand with its day.');
    }
    const { time: start, zoned, offsetS } = activity.start;
    const { distanceM, timerS: movingS, sport } = activity;
    const recording = {
      start,
      zoned,
      offsetS,
      distanceM,
      movingS,
      elapsedS: elapsed(activity, start),
      sport,
      cautions: [],
    };
    return judge(recording, { file, format: 'tcx', timeZone, unnamedIsRide: false });
  });
}

/** Seconds from first to last point where they span the timer, else to the end of the last lap. */
function elapsed({ firstPoint, lastPoint, timerS, lapsEnd }: TcxActivity, start: number): number {
  const points =
    firstPoint === null || lastPoint === null ? 0 : (lastPoint - Math.min(firstPoint, start)) / 1000;
  const plausible = points >= timerS && points <= timerS + 2 * 86_400;
  return plausible ? points : Math.max(timerS, lapsEnd === null ? 0 : (lapsEnd - start) / 1000);
}

const without = (file: string, message: string): RideFileResult => ({
  file,
  format: 'tcx',
  outcome: 'not-a-ride',
  ride: null,
  message,
});

function emptySentence(reader: TcxReader): string {
  if (reader.courses > 0)
    return 'The file holds a planned course, not a ride: send the recording from after the ride.';
  if (reader.workouts > 0)
    return 'The file holds a workout plan, not a ride: send the recording from after the ride.';
  return 'The file holds no activity: send the recording of the ride.';
}
