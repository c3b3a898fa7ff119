import type { CsvMatching } from '@halfpitch/ride-files';
import { useCallback, useRef, useState } from 'react';
import { errorSentence } from '../../app/api-problem';
import { addImport } from './api/add-import';
import type { ImportChoice } from './api/add-import';
import { isTable, refusal } from './upload';
import type { Upload } from './upload';

const GONE = 'The file can no longer be read on this device: choose it again.';

/** Sends files one after the other; one that fails does not hold up the rest, and a table waits to be looked at. */
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
    change(upload.key, { ...upload, trouble: null, sent: 0 });
    line.current = line.current.then(() => send(upload));
  };

  const open = async ({ key, file }: Upload) => {
    try {
      change(key, { table: new Uint8Array(await file.arrayBuffer()) });
    } catch {
      change(key, { trouble: GONE });
    }
  };

  const add = (files: readonly File[], choice: ImportChoice) => {
    const added = files.map((file): Upload => {
      next.current += 1;
      const trouble = refusal(file);
      return { key: next.current, file, choice, table: null, sent: 0, importId: null, trouble };
    });
    setUploads((all) => [...all, ...added]);
    for (const upload of added.filter(({ trouble }) => trouble === null)) {
      if (isTable(upload.file)) void open(upload);
      else enqueue(upload);
    }
  };

  return {
    uploads,
    add,
    /** Again, or with other choices. */
    send: enqueue,
    match: (upload: Upload, matching: CsvMatching) =>
      enqueue({ ...upload, table: null, choice: { ...upload.choice, matching } }),
    leave: ({ key }: Upload) => setUploads((all) => all.filter((one) => one.key !== key)),
  };
}
