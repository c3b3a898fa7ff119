/** What a file, or one recording in it, turned out to be. */
export type Outcome = 'ride' | 'other-sport' | 'not-a-ride' | 'unreadable';

export type FileSurface = 'road' | 'gravel' | 'mountain' | 'indoor';
export type FileWeather = 'dry' | 'damp' | 'wet' | 'mud';
export type FileFormat = 'gpx' | 'tcx' | 'fit' | 'csv';

/** One ride as its file tells it; what the file does not say is null. */
export interface FileRide {
  /** Calendar day 'YYYY-MM-DD' where the rider was, as far as the file or the given time zone tells. */
  date: string;
  /** ISO instant of the start, null when the file gives a day only or a wall clock without a zone. */
  startedAt: string | null;
  /** Metres, 0 when the device recorded none. */
  distanceM: number;
  /** Seconds in motion (timer time where the device keeps one). */
  movingS: number | null;
  /** Seconds from start to finish. */
  elapsedS: number | null;
  /** In the file's own words, e.g. 'cycling/commuting'. */
  sport: string | null;
  indoor: boolean | null;
  surface: FileSurface | null;
  weather: FileWeather | null;
}

/** One recording, or one file that holds none. Several may come out of one file. */
export interface RideFileResult {
  /** File name; inside an archive 'archive.zip/name.gpx'. */
  file: string;
  format: FileFormat | null;
  outcome: Outcome;
  /** The recording; also one of another sport (a rider may say it was a ride) or one that never moves. Null when there is none. */
  ride: FileRide | null;
  /** Plain sentence: what was found, or what is wrong and what to do. */
  message: string;
  /** Metres of a track without times, which the rider may log by hand. */
  untimedM?: number;
  /** Line of a CSV, counted from 1. */
  line?: number;
  /** True when the CSV needs its columns matched first: show inspectCsv, then use readCsv. */
  needsMatching?: boolean;
}
