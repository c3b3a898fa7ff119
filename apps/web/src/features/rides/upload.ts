import { MAX_IMPORT_BYTES } from '@halfpitch/contracts';
import type { ImportChoice } from './api/add-import';

/** One file on its way to the server. */
export interface Upload {
  key: number;
  file: File;
  choice: ImportChoice;
  /** A table whose columns the rider has yet to look at. */
  table: Uint8Array | null;
  /** Share of the bytes sent. */
  sent: number;
  /** The server's number for it, once it is there. */
  importId: string | null;
  /** Why it was not sent. */
  trouble: string | null;
}

export const isTable = ({ name }: File) => /\.(csv|tsv|txt)$/i.test(name);

/** Why a file need not be sent at all, or null. */
export function refusal({ size }: File): string | null {
  if (size === 0) return 'The file is empty.';
  if (size > MAX_IMPORT_BYTES)
    return `The file is larger than ${MAX_IMPORT_BYTES / 1024 / 1024} MB: split it, or pack it as .zip or .gz.`;
  return null;
}

export const canRetry = ({ trouble, file }: Upload) => trouble !== null && refusal(file) === null;

/** Whether the server does not have it yet, though it could. */
export const isUnsent = ({ importId, file }: Upload) => importId === null && refusal(file) === null;
