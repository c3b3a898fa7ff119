import { rideInput } from '@halfpitch/contracts';
import type { Bike, Ride } from '@halfpitch/contracts';
import { useEffect, useRef } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { useSession } from '../../app/session';
import { Form } from '../../components/form';
import { SubmitButton } from '../../components/submit-button';
import { RideFields } from './ride-fields';
import { useLogRide } from './use-log-ride';
import { usualSurface } from './usual-rides';

interface LogFormProps {
  bikes: readonly Bike[];
  /** Newest first. */
  rides: readonly Ride[];
  /** The bike that is chosen at first. */
  bike: Bike;
}

/** Another bike is ridden on other ground. */
function FollowBike({ bikes, rides, bike }: LogFormProps) {
  const { setValue } = useFormContext();
  const chosen = useWatch({ name: 'bikeId' }) as string;
  const last = useRef(bike.id);
  useEffect(() => {
    const next = bikes.find(({ id }) => id === chosen);
    if (next && last.current !== chosen) setValue('surface', usualSurface(next, rides));
    last.current = chosen;
  }, [bikes, rides, chosen, setValue]);
  return null;
}

export function LogForm(props: LogFormProps) {
  const { bikes, rides, bike } = props;
  const { workshop, riderId } = useSession();
  const navigate = useNavigate();
  const log = useLogRide(bikes);
  return (
    <Form
      schema={rideInput}
      defaultValues={{ bikeId: bike.id, day: workshop.today, surface: usualSurface(bike, rides) }}
      onSubmit={async (values) => {
        await log(values);
        await navigate(riderId === null ? `/bikes/${values.bikeId}` : '/');
      }}
    >
      <FollowBike {...props} />
      <RideFields bikes={bikes} start />
      <SubmitButton size="lg" width={{ base: 'full', sm: 'auto' }} alignSelf="flex-start">
        Save the ride
      </SubmitButton>
    </Form>
  );
}
