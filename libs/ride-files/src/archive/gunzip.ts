import { Gunzip } from 'fflate';
import { UnreadableFile } from '../unreadable';

/** Small, since packed data can grow a thousandfold between two looks at the limit. */
const CHUNK_BYTES = 16 * 1024;

/**
 * Unpacks a gzip file, stopping as soon as it grows beyond the limit.
 * @throws UnreadableFile with a plain sentence
 */
export function gunzip(packed: Uint8Array, limitBytes: number): Uint8Array {
  const pieces: Uint8Array[] = [];
  let size = 0;
  const stream = new Gunzip((piece) => {
    size += piece.length;
    if (size > limitBytes) {
      throw new UnreadableFile('The file unpacks to far more than a ride file does: it was not opened.');
    }
    pieces.push(piece);
  });
  try {
    for (let at = 0; at < packed.length; at += CHUNK_BYTES) {
      stream.push(packed.subarray(at, at + CHUNK_BYTES), at + CHUNK_BYTES >= packed.length);
    }
  } catch (error) {
    if (error instanceof UnreadableFile) throw error;
    throw new UnreadableFile('The packed file is damaged or breaks off: pack it again.');
  }
  const whole = new Uint8Array(size);
  let at = 0;
  for (const piece of pieces) {
    whole.set(piece, at);
    at += piece.length;
  }
  return whole;
}
