import { extname, join } from 'node:path';
import { Worker } from 'node:worker_threads';
import { Calendar, Choices, ReadFile, readRides } from './read-rides';
import type { Reading } from './read-rides.worker';

/** A plain file below this is read within a tenth of a second; larger and packed ones are read in a thread. */
const AT_ONCE_BYTES = 64 * 1024;

/** What a thread may use: more than a million-point track needs. */
export interface Bounds {
  heapMb: number;
  timeMs: number;
}
const BOUNDS: Bounds = { heapMb: 384, timeMs: 120_000 };

/** As itself where compiled; from its source, as specs run it, by way of tsx. */
const SOURCE = extname(__filename);
const EXEC_ARGV = SOURCE === '.ts' ? ['--require', 'tsx/cjs'] : [];

const isPacked = ([first, second]: Uint8Array) =>
  (first === 0x50 && second === 0x4b) || (first === 0x1f && second === 0x8b);

const given = (message: string): ReadFile => ({
  rides: [],
  problems: [{ line: null, message }],
  otherSport: 0,
  message,
});

/** Reads a file so that no request waits for it: a large one in a thread of its own with bounded memory and time. */
export function readAside(
  choices: Choices,
  bytes: Uint8Array,
  calendar: Calendar,
  bounds = BOUNDS,
): Promise<ReadFile> {
  if (bytes.length < AT_ONCE_BYTES && !isPacked(bytes)) return readRides(choices, bytes, calendar);
  const { fileName, otherSports, matching } = choices;
  return inThread({ choices: { fileName, otherSports, matching }, bytes, calendar }, bounds);
}

function inThread(reading: Reading, { heapMb, timeMs }: Bounds): Promise<ReadFile> {
  const worker = new Worker(join(__dirname, `read-rides.worker${SOURCE}`), {
    workerData: reading,
    execArgv: EXEC_ARGV,
    resourceLimits: { maxOldGenerationSizeMb: heapMb },
  });
  return new Promise<ReadFile>((resolve, reject) => {
    const late = setTimeout(
      () => resolve(given('The file takes too long to read: split it and try again.')),
      timeMs,
    );
    worker.once('exit', () => {
      clearTimeout(late);
      reject(new Error('The thread that reads a file ended before it was through.'));
    });
    worker.once('message', resolve);
    worker.once('error', (error: NodeJS.ErrnoException) => {
      if (error.code !== 'ERR_WORKER_OUT_OF_MEMORY') return reject(error);
      resolve(given('The file needs more memory than there is for one: split it and try again.'));
    });
  }).finally(() => void worker.terminate());
}
