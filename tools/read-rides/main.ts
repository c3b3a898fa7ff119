import { readdir, readFile, stat } from 'node:fs/promises';
import { join, relative } from 'node:path';
import { defaultLimits, readWholeRideFile, summariseFile, type RideFileResult } from '@halfpitch/ride-files';

/** Prints what the importer makes of every file in a folder, one JSON line each: npm run -s read-rides -- DIR */
async function main(): Promise<void> {
  const [folder] = process.argv.slice(2);
  if (folder === undefined) throw new Error('Give the folder to read: npm run -s read-rides -- DIR');
  const entries = await readdir(folder, { recursive: true, withFileTypes: true });
  const paths = entries.filter((entry) => entry.isFile()).map((entry) => join(entry.parentPath, entry.name));
  for (const path of paths.sort()) {
    const file = relative(folder, path);
    const line = summariseFile(file, await readAll(file, path));
    await new Promise<void>((resolve) => process.stdout.write(`${JSON.stringify(line)}\n`, () => resolve()));
  }
}

async function readAll(file: string, path: string): Promise<RideFileResult[]> {
  const most = Math.max(defaultLimits.xmlBytes, defaultLimits.archiveBytes);
  if ((await stat(path)).size > most)
    return [refused(file, 'The file is too large to be a ride: split it and try again.')];
  const bytes = await readFile(path).catch(() => null);
  if (bytes === null) return [refused(file, 'The file cannot be opened: check who may read it.')];
  return readWholeRideFile(file, bytes);
}

const refused = (file: string, message: string): RideFileResult => ({
  file,
  format: null,
  outcome: 'unreadable',
  ride: null,
  message,
});

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
});
