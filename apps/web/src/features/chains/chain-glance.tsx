import { Box, Link, Stack, Text } from '@chakra-ui/react';
import type { Chain } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { Link as RouterLink } from 'react-router-dom';
import { useFormat } from '../../app/use-format';
import { DueWindow } from '../../components/drawings/due-window';
import { LinkStrip } from '../../components/drawings/link-strip';
import { regimeWords } from '../../components/trade-words';
import { estimateQuery } from './api/estimate';
import { ChainAlerts } from './chain-alerts';
import { dueWords } from './chain-words';
import { WearLine } from './wear-line';

/** A fitted chain at a glance: how dry, when due, how worn, and what cannot wait. */
export function ChainGlance({ chain }: { chain: Chain }) {
  const { today } = useFormat();
  const { data: estimate } = useQuery(estimateQuery(chain.id));
  const { state } = chain;
  const due = dueWords[chain.regime];
  return (
    <Stack gap="5">
      <Box>
        <Text mb="3">
          <Link asChild fontWeight="semibold">
            <RouterLink to={`/chains/${chain.id}`}>{chain.label}</RouterLink>
          </Link>
          <Text as="span" color="fg.muted">
            {' '}
            · {regimeWords[chain.regime].toLowerCase()}
          </Text>
        </Text>
        {state ? (
          <LinkStrip share={state.shareUsed} label={chain.label} />
        ) : (
          <Text color="fg.muted">No estimate yet: it comes with the first ride.</Text>
        )}
      </Box>
      {state?.lubrication && (
        <Box>
          <Text color="fg.muted">{due}</Text>
          <DueWindow {...state.lubrication} today={today} label={due} />
        </Box>
      )}
      {estimate && <ChainAlerts alerts={estimate.alerts} regime={chain.regime} />}
      <WearLine chain={chain} />
    </Stack>
  );
}
