import { useCallback, useRef, useState } from 'react';
import { MAX_IMPORT_BYTES } from '@halfpitch/contracts';
import { errorSentence } from '../../app/api-problem';
import { addImport } from './api/add-import';
import type { ImportChoice } from './api/add-import';

export interface Upload {
  key: number;
  file: File;
  choice: ImportChoice;
  /** Share of the bytes sent. */
  sent: number;
  /** The server's number for it, once it is there. */
  importId: string | null;
  /** Why it was not sent. */
  trouble: string | null;
}

const tooLarge = ({ size }: File) =>
  size > MAX_IMPORT_BYTES ? `The file is larger than ${MAX_IMPORT_BYTES / 1024 / 1024} MB: split it.` : null;
const empty = ({ size }: File) => (size === 0 ? 'The file is empty.' : null);

/** Sends files one after the other; one that fails does not hold up the rest. */
export function useUploads() {
  const [uploads, setUploads] = useState<Upload[]>([]);
  const next = useRef(0);
  const line = useRef<Promise<void>>(Promise.resolve());

  const change = useCallback((key: number, part: Partial<Upload>) => {
    setUploads((all) => all.map((one) => (one.key === key ? { ...one, ...part } : one)));
  }, []);

  const send = useCallback(
    async ({ key, file, choice }: Upload) => {
      try {
        const { id } = await addImport(file, choice, (sent) => change(key, { sent }));
        change(key, { importId: id, sent: 1 });
      } catch (error) {
        change(key, { trouble: errorSentence(error) });
      }
    },
    [change],
  );

  const enqueue = (upload: Upload) => {
    line.current = line.current.then(() => send(upload));
  };

  const add = (files: readonly File[], choice: ImportChoice) => {
    const added = files.map((file): Upload => {
      next.current += 1;
      return {
        key: next.current,
        file,
        choice,
        sent: 0,
        importId: null,
        trouble: tooLarge(file) ?? empty(file),
      };
    });
    setUploads((all) => [...all, ...added]);
    added.filter(({ trouble }) => trouble === null).forEach(enqueue);
  };

  const retry = (upload: Upload) => {
    change(upload.key, { trouble: null, sent: 0 });
    enqueue(upload);
  };
  return { uploads, add, retry };
}
