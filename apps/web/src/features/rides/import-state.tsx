import { Button, Stack, Text } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { errorSentence } from '../../app/api-problem';
import { bikeQuery } from '../bikes/api/bike';
import { useChanged } from '../chains/follow-estimate';
import { importQuery } from './api/import';
import { ImportBar } from './import-bar';
import { ImportOutcome } from './import-outcome';
import { isThrough } from './import-words';

interface ImportStateProps {
  importId: string;
  bikeId: string;
  /** Sends the same file again, to count what it holds of other sports too. */
  onTake?: () => void;
}

/** A file on the server: how far it is read, then what came of it. */
export function ImportState({ importId, bikeId, onTake }: ImportStateProps) {
  const { data, error } = useQuery(importQuery(importId));
  const { data: bike } = useQuery(bikeQuery(bikeId));
  const chainId = bike?.fittedChainId ?? null;
  const changed = useChanged();
  const added = data && isThrough(data) ? data.added : 0;
  useEffect(() => {
    if (added > 0) changed(chainId);
  }, [added, chainId, changed]);
  if (!data && error) return <Text color="fg.error">{errorSentence(error)}</Text>;
  if (!data) return <ImportBar doing="Waiting" share={0} />;
  if (!isThrough(data)) {
    const seen = data.added + data.alreadyThere + data.refused;
    return (
      <ImportBar
        doing={data.state === 'waiting' ? 'Waiting' : 'Reading'}
        share={data.total > 0 ? seen / data.total : 0}
      />
    );
  }
  return (
    <Stack gap="2" align="flex-start">
      <ImportOutcome found={data} />
      {data.otherSport > 0 && onTake && (
        <Button size="sm" variant="outline" onClick={onTake}>
          It was a ride: count it
        </Button>
      )}
    </Stack>
  );
}
