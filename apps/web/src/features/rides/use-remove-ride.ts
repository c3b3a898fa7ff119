import type { Ride } from '@halfpitch/contracts';
import { v7 } from 'uuid';
import { useFormat } from '../../app/use-format';
import { toastDone, toastError } from '../../components/toaster';
import { useChanged } from '../chains/follow-estimate';
import { addRide } from './api/add-ride';
import { removeRide } from './api/remove-ride';

/** Removes a ride at once; for a while it can be put back. */
export function useRemoveRide() {
  const { distance } = useFormat();
  const changed = useChanged();
  return async (ride: Ride) => {
    const { bikeId, day, distanceM, movingS, surface, weather, notes } = ride;
    const key = v7();
    const putBack = async () => {
      const again = await addRide({ bikeId, day, distanceM, movingS, surface, weather, notes }, key);
      changed(again.chainId);
    };
    try {
      await removeRide(ride.id);
      changed(ride.chainId);
      toastDone(`${distance(distanceM)} is removed.`, () => void putBack().catch(toastError));
    } catch (error) {
      toastError(error);
    }
  };
}
