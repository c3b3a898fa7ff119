import { fingerprintAll, readWholeRideFile, summariseFile } from '@halfpitch/ride-files';
import type { CsvMatching, FileFormat, FileRide, RideFileResult } from '@halfpitch/ride-files';
import type { RideImport as WireImport } from '@halfpitch/contracts';
import { wrongDay } from './rides.policy';

/** A ride of a file, ready to be kept. */
export interface ReadRide extends FileRide {
  format: FileFormat;
  fingerprint: string;
}

export interface ReadFile {
  rides: ReadRide[];
  problems: WireImport['problems'];
  /** Of the problems, recordings of another sport. */
  otherSport: number;
  /** The whole file in a sentence, where it holds no ride. */
  message: string;
}

/** What the rider says about the file. */
export interface Choices {
  fileName: string;
  otherSports: 'leave' | 'take';
  matching: CsvMatching | null;
}
/** Where the workshop is, and which day it is there. */
export interface Calendar {
  timeZone: string;
  today: string;
}

/** Why a recording is left out, or null where it is a ride to keep. */
function refusal({ outcome, ride, message }: RideFileResult, { otherSports }: Choices, today: string) {
  const wanted = outcome === 'ride' || (outcome === 'other-sport' && otherSports === 'take');
  if (!wanted || !ride) return message;
  if (ride.distanceM < 1) return 'No distance was recorded: log it by hand if you know it.';
  if (ride.distanceM > 2_000_000) return `${Math.round(ride.distanceM / 1000)} km is too far for one ride.`;
  return wrongDay(ride.date, today);
}

/** Everything that a file holds, each recording either a ride or a problem; the same file always gives the same. */
export async function readRides(
  choices: Choices,
  bytes: Uint8Array,
  { timeZone, today }: Calendar,
): Promise<ReadFile> {
  const { fileName, matching, otherSports } = choices;
  const results = await readWholeRideFile(fileName, bytes, { timeZone, ...(matching && { matching }) });
  const rides: Omit<ReadRide, 'fingerprint'>[] = [];
  const problems: WireImport['problems'] = [];
  for (const result of results) {
    const refused = refusal(result, choices, today);
    if (refused === null) rides.push({ ...result.ride!, format: result.format! });
    else
      problems.push({
        line: result.line ?? null,
        message: result.file === fileName ? refused : `${result.file}: ${refused}`,
      });
  }
  const fingerprints = fingerprintAll(rides);
  return {
    rides: rides.map((ride, index) => ({ ...ride, fingerprint: fingerprints[index]! })),
    problems,
    otherSport:
      otherSports === 'take' ? 0 : results.filter(({ outcome }) => outcome === 'other-sport').length,
    message: rides.length > 0 ? '' : summariseFile(fileName, results).message,
  };
}
