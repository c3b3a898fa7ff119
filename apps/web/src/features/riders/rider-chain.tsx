import { Box, Button, Flex, Link, Text } from '@chakra-ui/react';
import { roleMay } from '@halfpitch/contracts';
import type { Chain } from '@halfpitch/contracts';
import { Link as RouterLink } from 'react-router-dom';
import { useSession } from '../../app/session';
import { useFormat } from '../../app/use-format';
import { LinkStrip } from '../../components/drawings/link-strip';
import { regimeWords } from '../../components/trade-words';
import { dueWords } from '../chains/chain-words';
import { WearLine } from '../chains/wear-line';

/** A chain in the rider's page: how dry, when due, how worn. */
export function RiderChain({ chain }: { chain: Chain }) {
  const format = useFormat();
  const mayTreat = roleMay(useSession().role, 'treatments.write');
  const { state } = chain;
  return (
    <Box>
      <Flex justify="space-between" align="center" gap="3" mb="2" wrap="wrap">
        <Text>
          <Link asChild fontWeight="semibold">
            <RouterLink to={`/chains/${chain.id}`}>{chain.label}</RouterLink>
          </Link>
          <Text as="span" color="fg.muted">
            {' '}
            · {regimeWords[chain.regime].toLowerCase()}
          </Text>
        </Text>
        {mayTreat && (
          <Button asChild size="sm" variant="outline">
            <RouterLink to={`/bench/chains/${chain.id}`}>Take to the bench</RouterLink>
          </Button>
        )}
      </Flex>
      {state ? (
        <>
          <LinkStrip share={state.shareUsed} label={chain.label} />
          {state.lubrication && (
            <Text mt="2">
              <strong>{dueWords[chain.regime]}</strong> {format.window(state.lubrication)}.
            </Text>
          )}
          <WearLine chain={chain} />
        </>
      ) : (
        <Text color="fg.muted">Not estimated yet.</Text>
      )}
    </Box>
  );
}
