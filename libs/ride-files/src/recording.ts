import { localDay } from './day';
import type { FileFormat, FileRide, RideFileResult } from './types';
import { isCycling, isIndoor, sportWords, surfaceInSport } from './sport';
import { distanceWords } from './words';

/** One recording of a GPX, TCX or FIT file, before it is judged. Distances in metres, times in epoch ms. */
export interface Recording {
  start: number;
  zoned: boolean;
  offsetS: number | null;
  distanceM: number;
  movingS: number | null;
  elapsedS: number | null;
  sport: string | null;
  /** What must be said about it beside the sum: damage, odd speed. */
  cautions: string[];
}

/** Faster than this on average, 80 km/h, is no bicycle ride (common practice, no source). */
const TOO_FAST_M_PER_S = 80 / 3.6;
const FIRST_DEVICE_YEAR = 1990;

/**
 * Judges a recording: a ride, another sport, or nothing worth a ride.
 * @param unnamedIsRide whether a sport that the file does not name counts as cycling (GPX, which rarely names it)
 */
export function judge(
  recording: Recording,
  about: { file: string; format: FileFormat; timeZone: string | undefined; unnamedIsRide: boolean },
): RideFileResult {
  const ride = toRide(recording, about.timeZone);
  const { file, format } = about;
  const more = [...recording.cautions, ...cautions(ride)].map((sentence) => ` ${sentence}`).join('');
  const cycling = isCycling(recording.sport) ?? (about.unnamedIsRide && recording.sport === null);
  if (!cycling) {
    const message = `${otherSport(recording.sport)} It was left out: add it if it was a ride.${more}`;
    return { file, format, outcome: 'other-sport', ride, message };
  }
  if (ride.distanceM === 0 && !ride.movingS) {
    const message = `The recording of ${ride.date} does not move: there is no ride to count.`;
    return { file, format, outcome: 'not-a-ride', ride, message };
  }
  return { file, format, outcome: 'ride', ride, message: `${summary(ride)}${more}` };
}

function toRide(recording: Recording, timeZone: string | undefined): FileRide {
  return {
    date: localDay(recording.start, recording.offsetS, timeZone),
    startedAt: recording.zoned ? new Date(recording.start).toISOString() : null,
    distanceM: Math.round(recording.distanceM),
    movingS: recording.distanceM > 0 && recording.movingS === 0 ? null : whole(recording.movingS),
    elapsedS: whole(recording.elapsedS),
    sport: recording.sport,
    indoor: isIndoor(recording.sport),
    surface: surfaceInSport(recording.sport),
    weather: null,
  };
}

function otherSport(sport: string | null): string {
  const words = sportWords(sport ?? '');
  return words === ''
    ? 'The file does not say which sport it holds.'
    : `The file holds another sport (${words}).`;
}

const whole = (seconds: number | null) => (seconds === null ? null : Math.round(seconds));

function summary(ride: FileRide): string {
  if (ride.distanceM === 0) return `A ride on ${ride.date} without a distance: type the distance in.`;
  return `A ride of ${distanceWords(ride.distanceM)} on ${ride.date}.`;
}

function cautions(ride: FileRide): string[] {
  const found: string[] = [];
  const seconds = ride.elapsedS ?? ride.movingS;
  if (seconds !== null && ride.distanceM > TOO_FAST_M_PER_S * Math.max(seconds, 1)) {
    found.push('It is faster than a bicycle goes: check the distance.');
  }
  if (Number(ride.date.slice(0, 4)) < FIRST_DEVICE_YEAR)
    found.push('The device’s clock was not set: check the date.');
  return found;
}
