import { Box, Button, Flex, Heading, Link, Stack, Text } from '@chakra-ui/react';
import type { Bike, Chain, Rider } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { Link as RouterLink } from 'react-router-dom';
import { EmptyState } from '../../components/empty-state';
import { Loaded } from '../../components/loaded';
import { Panel } from '../../components/panel';
import { bikeKindWords } from '../../components/trade-words';
import { bikesQuery } from '../bikes/api/bikes';
import { allChainsQuery } from '../chains/api/chains';
import { RiderChain } from './rider-chain';

function BikeOf({ bike, chains }: { bike: Bike; chains: Chain[] }) {
  return (
    <Panel>
      <Heading as="h2" size="lg">
        <Link asChild>
          <RouterLink to={`/bikes/${bike.id}`}>{bike.name}</RouterLink>
        </Link>
      </Heading>
      <Text color="fg.muted" mb="4">
        {bikeKindWords[bike.kind]}, {bike.speeds} speeds
      </Text>
      {chains.length === 0 && <Text>No chain is on it.</Text>}
      {chains.map((chain) => (
        <RiderChain key={chain.id} chain={chain} />
      ))}
    </Panel>
  );
}

/** The rider's bikes with the chain on each, and the chains that lie in the box. */
export function RiderBikes({ rider }: { rider: Rider }) {
  const bikes = useQuery(bikesQuery({ riderId: rider.id }));
  const chains = useQuery(allChainsQuery({ riderId: rider.id }));
  const all = chains.data?.items ?? [];
  const boxed = all.filter(({ bikeId }) => bikeId === null);
  const add = (
    <Button asChild variant="outline">
      <RouterLink to={`/bikes/new?rider=${rider.id}`}>Add a bike</RouterLink>
    </Button>
  );
  return (
    <Stack gap="5">
      <Loaded query={bikes} rows={2} height="10rem">
        {({ items }) =>
          items.length === 0 ? (
            <EmptyState title="No bike yet" action={add}>
              Add the bike and its chain: the estimate starts with them.
            </EmptyState>
          ) : (
            <>
              {items.map((bike) => (
                <BikeOf key={bike.id} bike={bike} chains={all.filter(({ bikeId }) => bikeId === bike.id)} />
              ))}
              {boxed.length > 0 && (
                <Panel title="In the box">
                  <Stack gap="6">
                    {boxed.map((chain) => (
                      <RiderChain key={chain.id} chain={chain} />
                    ))}
                  </Stack>
                </Panel>
              )}
              <Flex>{add}</Flex>
            </>
          )
        }
      </Loaded>
      {chains.error && <Box role="alert">The chains could not be read. Reload the page.</Box>}
    </Stack>
  );
}
