import { Button, Flex } from '@chakra-ui/react';
import { rideInput } from '@halfpitch/contracts';
import type { Bike, Ride } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { Form } from '../../components/form';
import { TextField } from '../../components/fields/text-field';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { bikeQuery } from '../bikes/api/bike';
import { bikesQuery } from '../bikes/api/bikes';
import { useChanged } from '../chains/follow-estimate';
import { changeRide } from './api/change-ride';
import { rideQuery } from './api/ride';
import { RideFields } from './ride-fields';

function RideForm({ ride, bikes }: { ride: Ride; bikes: Bike[] }) {
  const navigate = useNavigate();
  const changed = useChanged();
  const back = () => void navigate(-1);
  return (
    <Form
      schema={rideInput}
      defaultValues={ride}
      onSubmit={async (values) => {
        const saved = await changeRide(ride.id, values);
        changed(saved.chainId);
        toastDone('The ride is changed.');
        back();
      }}
    >
      <RideFields bikes={bikes} />
      <TextField name="notes" label="Notes" lines={2} />
      <Flex gap="3">
        <SubmitButton>Save</SubmitButton>
        <Button variant="outline" onClick={back}>
          Back
        </Button>
      </Flex>
    </Form>
  );
}

/** Corrects a ride; the estimate follows. */
export function EditRide() {
  const { id = '' } = useParams();
  const ride = useQuery(rideQuery(id));
  const bike = useQuery({ ...bikeQuery(ride.data?.bikeId ?? ''), enabled: ride.data !== undefined });
  const riderId = bike.data?.riderId;
  const bikes = useQuery({ ...bikesQuery({ riderId }), enabled: riderId !== undefined });
  return (
    <>
      <PageHeader title="Edit the ride" />
      <Loaded query={ride}>
        {(found) => <Loaded query={bikes}>{(all) => <RideForm ride={found} bikes={all.items} />}</Loaded>}
      </Loaded>
    </>
  );
}
