import { Button, Grid, Stack } from '@chakra-ui/react';
import { roleMay } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { Link as RouterLink, useParams } from 'react-router-dom';
import { useSession } from '../../app/session';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { riderQuery } from './api/rider';
import { RemoveRider } from './remove-rider';
import { RiderAccess } from './rider-access';
import { RiderBikes } from './rider-bikes';
import { RiderDetails } from './rider-details';
import { RiderReminders } from './rider-reminders';

/** A rider with their bikes, chains and how they are written to. */
export function RiderPage() {
  const { id = '' } = useParams();
  const mayWrite = roleMay(useSession().role, 'riders.write');
  const query = useQuery(riderQuery(id));
  return (
    <Loaded query={query} rows={3} height="9rem">
      {(rider) => (
        <>
          <PageHeader
            title={rider.name}
            actions={
              mayWrite && (
                <Button asChild variant="outline">
                  <RouterLink to={`/riders/${id}/edit`}>Change details</RouterLink>
                </Button>
              )
            }
          />
          <Grid templateColumns={{ base: '1fr', lg: 'minmax(0, 1fr) 22rem' }} gap="8" alignItems="start">
            <RiderBikes rider={rider} />
            <Stack gap="6">
              <RiderDetails rider={rider} />
              {mayWrite && (
                <>
                  <RiderAccess rider={rider} />
                  <RiderReminders rider={rider} />
                  <RemoveRider rider={rider} />
                </>
              )}
            </Stack>
          </Grid>
        </>
      )}
    </Loaded>
  );
}
