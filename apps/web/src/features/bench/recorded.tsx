import { Box, Button, Flex, Heading, Skeleton, Stack, Text } from '@chakra-ui/react';
import type { Chain, Treatment } from '@halfpitch/contracts';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { Link as RouterLink } from 'react-router-dom';
import { useFormat } from '../../app/use-format';
import { DueWindow } from '../../components/drawings/due-window';
import { LinkStrip } from '../../components/drawings/link-strip';
import { toastDone, toastError } from '../../components/toaster';
import { treatmentWords } from '../../components/trade-words';
import { chainQuery } from '../chains/api/chain';
import { deleteTreatment } from './api/treatments';
import { ClosedReminder } from './closed-reminder';

interface RecordedProps {
  treatment: Treatment;
  /** The estimate as it was before. */
  before: Chain['state'];
  onUndone: () => void;
  onAnother: () => void;
}

const ASK_AGAIN_MS = 700;

/** After saving: the window that follows from it, as soon as the estimate has moved. */
export function Recorded({ treatment, before, onUndone, onAnother }: RecordedProps) {
  const format = useFormat();
  const client = useQueryClient();
  const { data: chain } = useQuery({
    ...chainQuery(treatment.chainId),
    refetchInterval: (query) => (query.state.data?.state?.madeAt === before?.madeAt ? ASK_AGAIN_MS : false),
  });
  const state = chain?.state?.madeAt === before?.madeAt ? null : chain?.state;
  const undo = async () => {
    await deleteTreatment(treatment.id);
    await client.invalidateQueries({ queryKey: ['treatments'] });
    toastDone('The treatment was taken back. A reading you entered with it stays.');
    onUndone();
  };
  return (
    <Box
      as="section"
      p={{ base: 5, md: 8 }}
      bg="bg.panel"
      borderWidth="1px"
      borderRadius="l3"
      maxWidth="48rem"
    >
      <Heading as="h2" size="xl" role="status">
        {treatmentWords[treatment.kind]} recorded
      </Heading>
      <Text color="fg.muted" mb="6">
        {format.day(treatment.day)}, by {treatment.by}
      </Text>
      {state ? (
        <Stack gap="5" aria-live="polite">
          <LinkStrip share={state.shareUsed} />
          <Box>
            <Text fontWeight="semibold">Due again</Text>
            {state.lubrication ? (
              <DueWindow {...state.lubrication} today={format.today} label="Due again" />
            ) : (
              <Text>Once it is on a bike again: in the box its treatment does not run out.</Text>
            )}
            {before?.lubrication && (
              <Text color="fg.muted">It was {format.window(before.lubrication)} before.</Text>
            )}
          </Box>
          <ClosedReminder chainId={treatment.chainId} />
        </Stack>
      ) : (
        <Stack gap="3" role="status">
          <Text>Estimating anew…</Text>
          <Skeleton height="6rem" />
        </Stack>
      )}
      <Flex gap="3" mt="8" wrap="wrap">
        <Button asChild size="lg">
          <RouterLink to="/bench">Back to the bench</RouterLink>
        </Button>
        <Button size="lg" variant="outline" onClick={onAnother}>
          Record another
        </Button>
        <Button size="lg" variant="outline" onClick={() => void undo().catch(toastError)}>
          Undo
        </Button>
      </Flex>
    </Box>
  );
}
