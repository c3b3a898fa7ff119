import { Button, Stack, Text } from '@chakra-ui/react';
import { useQueries } from '@tanstack/react-query';
import { importQuery } from './api/import';
import { ImportBar } from './import-bar';
import { importWords, isThrough, sumOf } from './import-words';
import { canRetry } from './upload';
import type { Upload } from './upload';

interface ImportSumProps {
  uploads: readonly Upload[];
  onSend: (upload: Upload) => void;
}

/** All files of this visit together, where there are several. */
export function ImportSum({ uploads, onSend }: ImportSumProps) {
  const queries = uploads.flatMap(({ importId }) => (importId === null ? [] : [importQuery(importId)]));
  const found = useQueries({ queries }).flatMap(({ data }) => (data && isThrough(data) ? [data] : []));
  const stuck = uploads.filter(canRetry);
  if (uploads.length < 2) return null;
  const settled = found.length + uploads.filter(({ trouble }) => trouble !== null).length;
  return (
    <Stack gap="2" align="stretch">
      <ImportBar doing={`${settled} of ${uploads.length} files`} share={settled / uploads.length} />
      {found.length > 0 && (
        <Text role="status" fontWeight="semibold">
          All together: {importWords(sumOf(found))}
        </Text>
      )}
      {stuck.length > 1 && (
        <Button variant="outline" alignSelf="flex-start" onClick={() => stuck.forEach(onSend)}>
          Send the {stuck.length} that did not get through again
        </Button>
      )}
    </Stack>
  );
}
