import { Stack, Text } from '@chakra-ui/react';
import type { Bike, RideQuery } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Loaded } from '../../components/loaded';
import { Paging } from '../../components/paging';
import { ridesQuery } from './api/rides';
import { RideRow } from './ride-row';

const SIZE = 8;

interface RideListProps {
  filter: Pick<Partial<RideQuery>, 'bikeId' | 'chainId' | 'riderId'>;
  /** Where rides of several bikes stand together, to tell them apart. */
  bikes?: readonly Bike[];
}

/** Rides, newest first, to look at, correct and remove. */
export function RideList({ filter, bikes = [] }: RideListProps) {
  const [page, setPage] = useState(1);
  const rides = useQuery(ridesQuery({ ...filter, page, size: SIZE }));
  return (
    <Loaded query={rides} rows={4} height="3rem">
      {(found) =>
        found.total === 0 ? (
          <Text color="fg.muted">No ride is logged yet.</Text>
        ) : (
          <>
            <Stack as="ul" listStyle="none" gap="0" separator={undefined}>
              {found.items.map((ride) => (
                <RideRow
                  key={ride.id}
                  ride={ride}
                  bikeName={bikes.length > 1 ? bikes.find(({ id }) => id === ride.bikeId)?.name : undefined}
                />
              ))}
            </Stack>
            <Paging {...found} onPage={setPage} />
          </>
        )
      }
    </Loaded>
  );
}
