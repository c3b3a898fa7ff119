import { Box, Button, Skeleton, Stack, Text } from '@chakra-ui/react';
import type { CsvMatching } from '@halfpitch/ride-files';
import { lazy, Suspense } from 'react';
import { ImportBar } from './import-bar';
import { ImportState } from './import-state';
import { ImportSum } from './import-sum';
import { canRetry } from './upload';
import type { Upload } from './upload';

const TableMatching = lazy(() => import('./table-matching'));

interface ImportListProps {
  uploads: readonly Upload[];
  /** Sends a file again, maybe with other choices. */
  onSend: (upload: Upload) => void;
  onMatch: (upload: Upload, matching: CsvMatching) => void;
  onLeave: (upload: Upload) => void;
}

function Progress({
  upload,
  onSend,
  onMatch,
  onLeave,
}: { upload: Upload } & Omit<ImportListProps, 'uploads'>) {
  const { trouble, table, importId, choice, sent } = upload;
  if (trouble !== null)
    return (
      <Stack gap="2" align="flex-start">
        <Text color="fg.error" fontWeight="semibold">
          {trouble}
        </Text>
        {canRetry(upload) && (
          <Button size="sm" variant="outline" onClick={() => onSend(upload)}>
            Send it again
          </Button>
        )}
      </Stack>
    );
  if (table !== null)
    return (
      <Suspense fallback={<Skeleton height="12rem" />}>
        <TableMatching
          bytes={table}
          onAdd={(matching) => onMatch(upload, matching)}
          onLeave={() => onLeave(upload)}
        />
      </Suspense>
    );
  if (importId === null) return <ImportBar doing="Sending" share={sent} />;
  const take = { ...upload, importId: null, choice: { ...choice, otherSports: 'take' as const } };
  return (
    <ImportState
      importId={importId}
      bikeId={choice.bikeId}
      onTake={choice.otherSports === 'take' || choice.matching ? undefined : () => onSend(take)}
    />
  );
}

/** File by file: how far it is and what came of it. */
export function ImportList({ uploads, ...actions }: ImportListProps) {
  return (
    <Stack gap="3">
      <ImportSum uploads={uploads} onSend={actions.onSend} />
      <Stack as="ul" listStyle="none" gap="3">
        {uploads.map((upload) => (
          <Box as="li" key={upload.key} bg="bg.panel" borderWidth="1px" borderRadius="l3" p="4">
            <Text fontWeight="semibold" mb="2" overflowWrap="anywhere">
              {upload.file.name}
            </Text>
            <Progress upload={upload} {...actions} />
          </Box>
        ))}
      </Stack>
    </Stack>
  );
}
