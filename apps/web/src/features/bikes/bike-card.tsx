import { Button, Flex, Heading, Link, Text } from '@chakra-ui/react';
import type { Bike, Chain } from '@halfpitch/contracts';
import { PenLine, Ruler } from 'lucide-react';
import { Link as RouterLink } from 'react-router-dom';
import { Panel } from '../../components/panel';
import { bikeKindWords } from '../../components/trade-words';
import { ChainGlance } from '../chains/chain-glance';
import { speedWords } from '../chains/chain-words';
import { SwapChain } from '../chains/swap-chain';

interface BikeCardProps {
  bike: Bike;
  /** The chain that is on it. */
  chain: Chain | undefined;
  /** Chains in the box that fit it. */
  spare: readonly Chain[];
}

function NoChain({ bike }: { bike: Bike }) {
  return (
    <Text color="fg.muted">
      No chain is on this bike.{' '}
      <Link asChild>
        <RouterLink to={`/chains/new?bike=${bike.id}`}>Add its chain</RouterLink>
      </Link>
    </Text>
  );
}

/** One bike with the state of its chain, and what is done most with it. */
export function BikeCard({ bike, chain, spare }: BikeCardProps) {
  return (
    <Panel aria-label={bike.name}>
      <Flex gap="3" justify="space-between" align="baseline" wrap="wrap" mb="4">
        <Heading as="h2" size="xl">
          <Link asChild variant="plain">
            <RouterLink to={`/bikes/${bike.id}`}>{bike.name}</RouterLink>
          </Link>
        </Heading>
        <Text color="fg.muted">
          {bikeKindWords[bike.kind]}, {speedWords(bike.speeds)}
        </Text>
      </Flex>
      {chain ? <ChainGlance chain={chain} /> : <NoChain bike={bike} />}
      <Flex gap="3" wrap="wrap" mt="6">
        <Button asChild>
          <RouterLink to={`/log?bike=${bike.id}`} aria-label={`Log a ride on ${bike.name}`}>
            <PenLine size={20} aria-hidden="true" /> Log a ride
          </RouterLink>
        </Button>
        {chain && (
          <Button asChild variant="outline">
            <RouterLink to={`/chains/${chain.id}/reading`} aria-label={`Enter a reading of ${chain.label}`}>
              <Ruler size={20} aria-hidden="true" /> Reading
            </RouterLink>
          </Button>
        )}
        <SwapChain bikeId={bike.id} bikeName={bike.name} spare={spare} />
      </Flex>
    </Panel>
  );
}
