import { Button, Stack } from '@chakra-ui/react';
import type { Bike, Chain } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { Plus } from 'lucide-react';
import { Link } from 'react-router-dom';
import { EmptyState } from '../../components/empty-state';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { allChainsQuery } from '../chains/api/chains';
import { BikeCard } from './bike-card';
import { bikesQuery } from './api/bikes';
import { ChainBox } from './chain-box';

const addBike = (
  <Button asChild variant="outline">
    <Link to="/bikes/new">
      <Plus size={20} aria-hidden="true" /> Add a bike
    </Link>
  </Button>
);

function Bikes({ bikes, chains }: { bikes: Bike[]; chains: Chain[] }) {
  const boxed = chains.filter(({ bikeId }) => bikeId === null);
  return (
    <Stack gap="6">
      {bikes.map((bike) => (
        <BikeCard
          key={bike.id}
          bike={bike}
          chain={chains.find(({ id }) => id === bike.fittedChainId)}
          spare={boxed.filter(({ speeds }) => speeds === bike.speeds)}
        />
      ))}
      <ChainBox chains={boxed} />
    </Stack>
  );
}

/** The rider's start page: every bike, its chain, and when it is due. */
export function MyBikes() {
  const bikes = useQuery(bikesQuery());
  const chains = useQuery(allChainsQuery());
  return (
    <>
      <PageHeader title="My bikes" actions={bikes.data?.total ? addBike : undefined} />
      <Loaded query={bikes} rows={2} height="22rem">
        {({ items }) =>
          items.length === 0 ? (
            <EmptyState title="No bike yet" action={addBike}>
              Add your bike and its chain. From your rides and the workshop’s treatments Halfpitch then works
              out when the chain is due.
            </EmptyState>
          ) : (
            <Loaded query={chains} rows={2} height="22rem">
              {(chainPage) => <Bikes bikes={items} chains={chainPage.items} />}
            </Loaded>
          )
        }
      </Loaded>
    </>
  );
}
