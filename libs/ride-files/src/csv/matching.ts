import type { FileRide, Outcome } from '../types';

export type CsvField =
  | 'date'
  | 'startTime'
  | 'distance'
  | 'movingTime'
  | 'elapsedTime'
  | 'surface'
  | 'weather'
  | 'indoor'
  | 'sport';
export type Delimiter = ',' | ';' | '\t' | '|';
export type DateOrder = 'ymd' | 'dmy' | 'mdy';
export type DistanceUnit = 'km' | 'mi' | 'm';
export type TimeUnit = 's' | 'min' | 'h';
/** What a time with one colon, '1:23', means. */
export type ShortClock = 'h:m' | 'm:s';

/** How the columns of a CSV are to be read: guessed by inspectCsv, corrected by the rider, used by readCsv. */
export interface CsvMatching {
  delimiter: Delimiter;
  hasHeader: boolean;
  decimal: '.' | ',';
  dateOrder: DateOrder;
  distanceUnit: DistanceUnit;
  /** Unit of plain numbers in time columns; 1:23:45 reads as hours whatever it says. */
  timeUnit: TimeUnit;
  shortClock: ShortClock;
  /** Column number, counted from 0, of each field that the file has. */
  columns: Partial<Record<CsvField, number>>;
}

/** Something that only the rider can know, with the answers to choose from. */
export interface CsvQuestion {
  about: 'date' | 'distance' | 'dateOrder' | 'distanceUnit' | 'decimal' | 'timeUnit';
  text: string;
  choices: string[];
}

export interface CsvProblem {
  /** Line of the file, counted from 1. */
  line: number;
  /** 'unreadable', or 'not-a-ride' and 'other-sport' for rows that were rightly left out. */
  outcome: Exclude<Outcome, 'ride'>;
  message: string;
}

export interface CsvRide extends FileRide {
  line: number;
}

export interface CsvInspection {
  matching: CsvMatching;
  /** Empty when the guess needs no confirmation. */
  questions: CsvQuestion[];
  columns: { index: number; header: string; samples: string[] }[];
  /** The first rows, as they stand in the file. */
  preview: { line: number; cells: string[] }[];
  /** The same rows, as the guess reads them. */
  rides: CsvRide[];
  problems: CsvProblem[];
  /** Rows below the header. */
  rows: number;
}

export interface CsvReading {
  rides: CsvRide[];
  problems: CsvProblem[];
}
