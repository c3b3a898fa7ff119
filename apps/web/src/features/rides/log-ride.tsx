import { Button, Stack } from '@chakra-ui/react';
import type { Bike, Ride } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { EmptyState } from '../../components/empty-state';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { Panel } from '../../components/panel';
import { useWhoseBikes } from '../bikes/use-whose-bikes';
import { ridesQuery } from './api/rides';
import { LogForm } from './log-form';
import { RideList } from './ride-list';
import { UsualButtons } from './usual-buttons';
import { usualRides } from './usual-rides';

interface LogPageProps {
  bikes: Bike[];
  rides: Ride[];
  /** From the address: the bike whose button was pressed. */
  wanted: string | null;
}

function LogPage({ bikes, rides, wanted }: LogPageProps) {
  const used = wanted ?? rides[0]?.bikeId;
  const bike = bikes.find(({ id }) => id === used) ?? bikes[0];
  if (!bike)
    return (
      <EmptyState
        title="No bike yet"
        action={
          <Button asChild>
            <Link to="/bikes/new">Add a bike</Link>
          </Button>
        }
      >
        A ride belongs to a bike: add yours first.
      </EmptyState>
    );
  return (
    <Stack gap="8">
      <LogForm key={bike.id} bikes={bikes} rides={rides} bike={bike} />
      <UsualButtons bikes={bikes} usual={usualRides(rides)} />
      <Panel title="Last rides">
        <RideList filter={{ riderId: bike.riderId }} bikes={bikes} />
      </Panel>
    </Stack>
  );
}

/** The rider's own bikes, or for staff those of the rider whose bike stands in the address. */
export function LogRide() {
  const { bikeId, riderId, bikes, isNamed } = useWhoseBikes();
  const rides = useQuery({ ...ridesQuery({ riderId, size: 50 }), enabled: riderId !== undefined });
  if (!isNamed)
    return (
      <EmptyState title="Whose ride is it?">
        Open the rider’s bike first and log the ride from there.
      </EmptyState>
    );
  return (
    <>
      <PageHeader title="Log a ride" />
      <Loaded query={bikes}>
        {(found) => (
          <Loaded query={rides}>
            {(last) => <LogPage bikes={found.items} rides={last.items} wanted={bikeId} />}
          </Loaded>
        )}
      </Loaded>
    </>
  );
}
