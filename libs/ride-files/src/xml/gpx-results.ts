import { judge, type Recording } from '../recording';
import type { RideFileResult } from '../types';
import { distanceWords } from '../words';
import type { GpxReader, GpxTrack } from './gpx';

/** What a GPX file holds, once it has streamed through its reader. */
export function gpxResults(reader: GpxReader, file: string, timeZone: string | undefined): RideFileResult[] {
  if (reader.tracks.length === 0) return [nothing(file, emptySentence(reader))];
  return reader.tracks.map((track) => {
    if (track.start === null || track.meter.firstTime === null) return untimed(file, track);
    const recording = toRecording(track, track.start.zoned, track.start.offsetS, track.meter.firstTime);
    return judge(recording, { file, format: 'gpx', timeZone, unnamedIsRide: true });
  });
}

function toRecording(
  { meter, sport }: GpxTrack,
  zoned: boolean,
  offsetS: number | null,
  start: number,
): Recording {
  const cautions = meter.untimed > 0 ? [`${meter.untimed} of ${meter.points} points carry no time.`] : [];
  const elapsedS = meter.lastTime === null ? null : (meter.lastTime - start) / 1000;
  return {
    start,
    zoned,
    offsetS,
    distanceM: meter.distanceM,
    movingS: meter.movingS,
    elapsedS,
    sport,
    cautions,
  };
}

/** A planned track, or one whose times were taken out: it has a length but no day. */
function untimed(file: string, track: GpxTrack): RideFileResult {
  const metres = Math.round(track.meter.distanceM);
  const message =
    `The track is ${distanceWords(metres)} long but carries no times, so it may be a plan: ` +
    'if you rode it, log the ride by hand with its day.';
  return { ...nothing(file, message), untimedM: metres };
}

const nothing = (file: string, message: string): RideFileResult => ({
  file,
  format: 'gpx',
  outcome: 'not-a-ride',
  ride: null,
  message,
});

function emptySentence(reader: GpxReader): string {
  if (reader.routes > 0)
    return 'The file holds a planned route, not a ride: send the recording from after the ride.';
  if (reader.waypoints > 0) return 'The file holds places only, no track: send the recording of the ride.';
  return 'The file holds no track: send the recording of the ride.';
}
