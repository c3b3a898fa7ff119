import type { Bike, RideInput } from '@halfpitch/contracts';
import { useFormat } from '../../app/use-format';
import { toastDone, toastError } from '../../components/toaster';
import { useChanged } from '../chains/follow-estimate';
import { addRide } from './api/add-ride';
import { removeRide } from './api/remove-ride';
import { useOnceKey } from './use-once-key';

/** Saves a ride, tells so, and lets it be taken back. */
export function useLogRide(bikes: readonly Bike[]) {
  const { distance } = useFormat();
  const changed = useChanged();
  const once = useOnceKey();
  return async (input: RideInput) => {
    const ride = await addRide(input, once.keyFor(input));
    once.accepted();
    changed(ride.chainId);
    const bike = bikes.find(({ id }) => id === ride.bikeId);
    const undo = async () => {
      await removeRide(ride.id);
      changed(ride.chainId);
      toastDone('The ride is taken back.');
    };
    toastDone(
      `${distance(ride.distanceM)} on ${bike?.name ?? 'the bike'} is logged.`,
      () => void undo().catch(toastError),
    );
  };
}
