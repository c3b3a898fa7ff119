import { gunzip } from './archive/gunzip';
import { unzip } from './archive/unzip';
import { csvResults } from './csv/csv-results';
import { contentOf } from './detect';
import { readFit } from './fit/read-fit';
import { letOthersRun } from './pause';
import { limitsOf, type ReadOptions } from './options';
import type { RideFileResult } from './types';
import { UnreadableFile } from './unreadable';
import { readXml } from './xml/read-xml';

/**
 * Reads a GPX, TCX, FIT or CSV file, or a .zip or .gz of them, and gives what it holds one by one.
 * Never throws for what a file holds: a file that cannot be read is a result with a plain sentence, and
 * harms no other file of its archive.
 */
export async function* readRideFile(
  name: string,
  bytes: Uint8Array,
  options: ReadOptions = {},
): AsyncGenerator<RideFileResult, void, undefined> {
  const limits = limitsOf(options);
  const content = contentOf(bytes);
  try {
    if (content !== 'zip' && content !== 'gzip') {
      yield* await readOne(name, bytes, options);
      return;
    }
    refuseBeyond(bytes, limits.archiveBytes);
    if (content === 'gzip') {
      yield* await readPacked(name.replace(/\.gz$/i, ''), gunzip(bytes, largest(options)), options);
      return;
    }
    for (const entry of unzip(bytes, limits)) {
      const inner = `${name}/${entry.name}`;
      if (entry.bytes) yield* await readPacked(inner, entry.bytes, options);
      else yield unreadable(inner, entry.message);
      await letOthersRun();
    }
  } catch (error) {
    yield unreadable(name, sentence(error));
  }
}

/** Everything that readRideFile gives, at once. */
export async function readWholeRideFile(
  name: string,
  bytes: Uint8Array,
  options: ReadOptions = {},
): Promise<RideFileResult[]> {
  const results: RideFileResult[] = [];
  for await (const result of readRideFile(name, bytes, options)) results.push(result);
  return results;
}

const MATCH_FIRST =
  'The table leaves open how its columns are meant: unpack it, send it by itself and match them.';

/** Reads a file that came out of an archive: an archive within is refused. */
async function readPacked(name: string, bytes: Uint8Array, options: ReadOptions): Promise<RideFileResult[]> {
  const content = contentOf(bytes);
  if (content !== 'zip' && content !== 'gzip') {
    const results = await readOne(name, bytes, options).catch((error: unknown) => [
      unreadable(name, sentence(error)),
    ]);
    return results.map((one) => (one.needsMatching ? { ...one, message: MATCH_FIRST } : one));
  }
  return [
    unreadable(name, 'An archive inside an archive is not opened: unpack it first and send what is in it.'),
  ];
}

async function readOne(name: string, bytes: Uint8Array, options: ReadOptions): Promise<RideFileResult[]> {
  const limits = limitsOf(options);
  switch (contentOf(bytes)) {
    case 'empty':
      throw new UnreadableFile('The file is empty: copy it from the device again.');
    case 'fit':
      refuseBeyond(bytes, limits.fitBytes);
      return readFit(name, bytes, options.timeZone);
    case 'xml':
      refuseBeyond(bytes, limits.xmlBytes);
      return readXml(name, bytes, options.timeZone);
    case 'text':
      refuseBeyond(bytes, limits.csvBytes);
      return csvResults(name, bytes, options.matching);
    default:
      throw new UnreadableFile('The file is of a kind that is not known here: send GPX, TCX, FIT or CSV.');
  }
}

function refuseBeyond(bytes: Uint8Array, limit: number): void {
  if (bytes.length > limit) {
    const megabytes = Math.floor(limit / (1024 * 1024));
    throw new UnreadableFile(
      `The file is larger than the ${megabytes} MB that can be read: split it and try again.`,
    );
  }
}

const largest = (options: ReadOptions) => {
  const { xmlBytes, fitBytes, csvBytes } = limitsOf(options);
  return Math.max(xmlBytes, fitBytes, csvBytes);
};

const unreadable = (file: string, message: string): RideFileResult => ({
  file,
  format: null,
  outcome: 'unreadable',
  ride: null,
  message,
});

function sentence(error: unknown): string {
  if (error instanceof UnreadableFile) return error.message;
  return 'The file is damaged in a way that was not foreseen: copy it from the device again.';
}
