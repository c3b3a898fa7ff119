import { unzipSync, type UnzipFileInfo } from 'fflate';
import type { Limits } from '../options';
import { UnreadableFile } from '../unreadable';

/** Below this an entry may be packed as tightly as it likes. */
const SMALL_BYTES = 1024 * 1024;

/** A file out of an archive, or the sentence that says why it could not be unpacked. */
export interface Unpacked {
  name: string;
  bytes: Uint8Array | null;
  message: string;
}

/**
 * Unpacks a zip one entry at a time, so that one entry at most is in memory. The sizes of the directory are
 * checked first and no entry can grow beyond the size that it declares there.
 * @throws UnreadableFile with a plain sentence when the archive as a whole is broken or a bomb
 */
export function* unzip(archive: Uint8Array, limits: Limits): Generator<Unpacked> {
  const entries = list(archive).filter(({ name }) => !name.endsWith('/') && !isHidden(name));
  if (entries.length === 0) throw new UnreadableFile('The archive holds no files.');
  if (entries.some(({ name }) => name === '[Content_Types].xml' || name === 'mimetype')) {
    throw new UnreadableFile('This is a spreadsheet or a document: save the table as CSV and send that.');
  }
  if (entries.length > limits.archiveEntries) {
    throw new UnreadableFile(`The archive holds more than ${limits.archiveEntries} files: send it in parts.`);
  }
  const total = entries.reduce((sum, entry) => sum + entry.originalSize, 0);
  const bomb = entries.some(
    (entry) => entry.originalSize > SMALL_BYTES && entry.originalSize > limits.archiveRatio * entry.size,
  );
  if (total > limits.unpackedBytes || bomb) {
    throw new UnreadableFile(
      'The archive unpacks to far more than ride files do: it was not opened. Send the files themselves.',
    );
  }
  for (const [index, entry] of entries.entries()) yield extract(archive, entry, index);
}

function list(archive: Uint8Array): UnzipFileInfo[] {
  const entries: UnzipFileInfo[] = [];
  try {
    unzipSync(archive, { filter: (entry) => (entries.push(entry), false) });
  } catch {
    throw new UnreadableFile('The archive is damaged or breaks off: pack it again.');
  }
  return entries;
}

function extract(archive: Uint8Array, wanted: UnzipFileInfo, index: number): Unpacked {
  let at = -1;
  const isWanted = ({ name }: UnzipFileInfo) => {
    if (name.endsWith('/') || isHidden(name)) return false;
    at += 1;
    return at === index;
  };
  try {
    const [bytes] = Object.values(unzipSync(archive, { filter: isWanted }));
    if (bytes?.length === wanted.originalSize) return { name: wanted.name, bytes, message: '' };
  } catch {
    // Falls through: fflate says in its own words what the sentence below says plainly.
  }
  return {
    name: wanted.name,
    bytes: null,
    message: 'The file is damaged in the archive or locked with a password: send it by itself.',
  };
}

/** Files that operating systems slip into archives. */
const isHidden = (name: string) =>
  name.split('/').some((part) => part.startsWith('.') || part === '__MACOSX');
