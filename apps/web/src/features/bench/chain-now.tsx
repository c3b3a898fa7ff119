import { Box, Grid, Heading, Text } from '@chakra-ui/react';
import type { Chain } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { useFormat } from '../../app/use-format';
import { DueWindow } from '../../components/drawings/due-window';
import { LinkStrip } from '../../components/drawings/link-strip';
import { treatmentWords } from '../../components/trade-words';
import { treatmentsQuery } from './api/treatments';
import { ElongationLine } from './elongation-line';

/** How the chain stood before it was touched: dryness, window, elongation, the last treatment. */
export function ChainNow({ chain }: { chain: Chain }) {
  const format = useFormat();
  const { data } = useQuery(treatmentsQuery(chain.id));
  const [last] = data?.items ?? [];
  const { state } = chain;
  return (
    <Box as="section" aria-label="How it stands" p="5" bg="bg.panel" borderWidth="1px" borderRadius="l3">
      {state ? (
        <Grid templateColumns={{ base: '1fr', md: '1fr 1fr' }} gap="6">
          <Box>
            <LinkStrip share={state.shareUsed} label={chain.label} />
            <Text mt="3" color="fg.muted">
              {last
                ? `Last: ${treatmentWords[last.kind].toLowerCase()}, ${format.day(last.day)}, by ${last.by}.`
                : 'No treatment is recorded yet.'}
            </Text>
          </Box>
          <Box>
            <Heading as="h2" size="md" mb="2">
              Due
            </Heading>
            {state.lubrication ? (
              <DueWindow {...state.lubrication} today={format.today} label="Treatment due" />
            ) : (
              <Text>It lies in the box: its treatment does not run out there.</Text>
            )}
            <Box mt="2">
              <ElongationLine chain={chain} state={state} />
            </Box>
          </Box>
        </Grid>
      ) : (
        <Text>This chain has not been estimated yet. You can record the treatment all the same.</Text>
      )}
    </Box>
  );
}
