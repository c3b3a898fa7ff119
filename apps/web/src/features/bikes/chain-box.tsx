import { Box, Flex, Link, Stack, Text } from '@chakra-ui/react';
import type { Chain } from '@halfpitch/contracts';
import { Link as RouterLink } from 'react-router-dom';
import { percent } from '../../app/format';
import { LinkStrip } from '../../components/drawings/link-strip';
import { drynessOf } from '../../components/drawings/dryness';
import { Panel } from '../../components/panel';
import { StateWord } from '../../components/state-word';
import { speedWords } from '../chains/chain-words';

function BoxedChain({ chain }: { chain: Chain }) {
  const { state } = chain;
  return (
    <Box>
      <Flex gap="3" justify="space-between" align="baseline" wrap="wrap" mb="2">
        <Link asChild fontWeight="semibold">
          <RouterLink to={`/chains/${chain.id}`}>{chain.label}</RouterLink>
        </Link>
        <Text color="fg.muted">{speedWords(chain.speeds)}</Text>
      </Flex>
      {state && <LinkStrip share={state.shareUsed} label={chain.label} bare />}
      {state && (
        <Flex gap="3" mt="2" align="baseline">
          <StateWord dryness={drynessOf(state.shareUsed)} />
          <Text color="fg.muted">{percent(state.shareUsed)} used</Text>
        </Flex>
      )}
    </Box>
  );
}

/** Chains that rest: on no bike, each with its own state. */
export function ChainBox({ chains }: { chains: readonly Chain[] }) {
  if (chains.length === 0) return null;
  return (
    <Panel title="In the box">
      <Stack gap="6">
        {chains.map((chain) => (
          <BoxedChain key={chain.id} chain={chain} />
        ))}
      </Stack>
    </Panel>
  );
}
