import { Box, Stack, Text } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useFormat } from '../../app/use-format';
import { Paging } from '../../components/paging';
import { Panel } from '../../components/panel';
import { importsQuery } from './api/imports';
import { ImportBar } from './import-bar';
import { importWords, isThrough } from './import-words';
import type { Upload } from './upload';

const SIZE = 6;

/** Files of earlier visits: a page that was closed is no reason to send them again. */
export function SentBefore({ riderId, uploads }: { riderId: string; uploads: readonly Upload[] }) {
  const { instant } = useFormat();
  const [page, setPage] = useState(1);
  const { data } = useQuery(importsQuery({ riderId, page, size: SIZE }));
  const before = data?.items.filter(({ id }) => !uploads.some(({ importId }) => importId === id)) ?? [];
  if (!data || before.length === 0) return null;
  return (
    <Panel title="Sent before">
      <Stack as="ul" listStyle="none" gap="3">
        {before.map((file) => (
          <Box as="li" key={file.id} borderTopWidth="1px" pt="3">
            <Text fontWeight="semibold" overflowWrap="anywhere">
              {file.fileName}
            </Text>
            <Text color="fg.muted" textStyle="sm">
              {instant(file.sentAt)}
            </Text>
            {isThrough(file) ? (
              <Text>{file.state === 'failed' && file.message ? file.message : importWords(file)}</Text>
            ) : (
              <ImportBar
                doing={file.state === 'waiting' ? 'Waiting' : 'Reading'}
                share={file.total > 0 ? (file.added + file.alreadyThere + file.refused) / file.total : 0}
              />
            )}
          </Box>
        ))}
      </Stack>
      <Paging {...data} onPage={setPage} />
    </Panel>
  );
}
