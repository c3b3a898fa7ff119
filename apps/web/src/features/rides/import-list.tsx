import { Box, Button, Stack, Text } from '@chakra-ui/react';
import { errorSentence } from '../../app/api-problem';
import type { RideImport } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { useChanged } from '../chains/follow-estimate';
import { bikeQuery } from '../bikes/api/bike';
import { importQuery } from './api/import';
import { ImportBar } from './import-bar';
import { ImportOutcome } from './import-outcome';
import type { Upload } from './use-uploads';

const isThrough = (found: RideImport) => found.state === 'done' || found.state === 'failed';

/** A file on the server: how far it is read, then what came of it. */
function Reading({ upload, importId }: { upload: Upload; importId: string }) {
  const { data, error } = useQuery(importQuery(importId));
  const { data: bike } = useQuery(bikeQuery(upload.choice.bikeId));
  const chainId = bike?.fittedChainId ?? null;
  const changed = useChanged();
  const added = data && isThrough(data) ? data.added : 0;
  useEffect(() => {
    if (added > 0) changed(chainId);
  }, [added, chainId, changed]);
  if (!data)
    return error ? (
      <Text color="fg.error">{errorSentence(error)}</Text>
    ) : (
      <ImportBar doing="Waiting" share={1} />
    );
  if (isThrough(data)) return <ImportOutcome found={data} />;
  const seen = data.added + data.alreadyThere + data.refused;
  return <ImportBar doing="Reading" share={data.total > 0 ? seen / data.total : 0} />;
}

function Progress({ upload, onRetry }: { upload: Upload; onRetry: (upload: Upload) => void }) {
  if (upload.trouble !== null)
    return (
      <Stack gap="2" align="flex-start">
        <Text color="fg.error" fontWeight="semibold">
          {upload.trouble}
        </Text>
        {upload.file.size > 0 && (
          <Button size="sm" variant="outline" onClick={() => onRetry(upload)}>
            Send it again
          </Button>
        )}
      </Stack>
    );
  if (upload.importId === null) return <ImportBar doing="Sending" share={upload.sent} />;
  return <Reading upload={upload} importId={upload.importId} />;
}

/** File by file: how far it is and what came of it. */
export function ImportList({
  uploads,
  onRetry,
}: {
  uploads: readonly Upload[];
  onRetry: (upload: Upload) => void;
}) {
  return (
    <Stack as="ul" listStyle="none" gap="3" aria-live="polite">
      {uploads.map((upload) => (
        <Box as="li" key={upload.key} bg="bg.panel" borderWidth="1px" borderRadius="l3" p="4">
          <Text fontWeight="semibold" mb="2" overflowWrap="anywhere">
            {upload.file.name}
          </Text>
          <Progress upload={upload} onRetry={onRetry} />
        </Box>
      ))}
    </Stack>
  );
}
