import type { Ride } from '@halfpitch/contracts';
import { useFormat } from '../../app/use-format';
import { toastDone, toastError } from '../../components/toaster';
import { useChanged } from '../chains/follow-estimate';
import { removeRide } from './api/remove-ride';
import { restoreRide } from './api/restore-ride';

/** Removes a ride at once; for a while it can be put back as what it was. */
export function useRemoveRide() {
  const { distance } = useFormat();
  const changed = useChanged();
  return async (ride: Ride) => {
    const putBack = async () => {
      const again = await restoreRide(ride.id);
      changed(again.chainId);
      toastDone('The ride is back.');
    };
    try {
      await removeRide(ride.id);
      changed(ride.chainId);
      toastDone(`${distance(ride.distanceM)} is removed.`, () => void putBack().catch(toastError));
    } catch (error) {
      toastError(error);
    }
  };
}
