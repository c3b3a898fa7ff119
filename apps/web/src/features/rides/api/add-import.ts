import { rideImport } from '@halfpitch/contracts';
import type { RideImport, Surface, Weather } from '@halfpitch/contracts';
import type { CsvMatching } from '@halfpitch/ride-files';
import { upload } from '../../../app/upload';

export interface ImportChoice {
  bikeId: string;
  /** For what the file does not say. */
  surface: Surface;
  weather: Weather;
  /** 'take': recordings of another sport, or of none that is named, count as rides too. */
  otherSports: 'leave' | 'take';
  /** How the columns of a table are meant. */
  matching?: CsvMatching;
}

/** Sends a file; the server reads it afterwards. */
export function addImport(
  file: File,
  { matching, ...choice }: ImportChoice,
  onProgress: (share: number) => void,
): Promise<RideImport> {
  const form = new FormData();
  for (const [name, value] of Object.entries(choice)) form.append(name, value);
  if (matching) form.append('matching', JSON.stringify(matching));
  form.append('file', file);
  return upload('/imports', form, { schema: rideImport, onProgress });
}
