import type { Reading } from '@halfpitch/contracts';
import { v7 } from 'uuid';
import { toastDone, toastError } from '../../components/toaster';
import { useChanged } from '../chains/follow-estimate';
import { addReading } from './api/add-reading';
import { removeReading } from './api/remove-reading';
import { readingWords } from './reading-words';

/** Removes a reading at once; for a while it can be put back. */
export function useRemoveReading() {
  const changed = useChanged();
  return async (reading: Reading) => {
    const { chainId, day, method, values, lower, upper, baseline, notes } = reading;
    const key = v7();
    const putBack = async () => {
      await addReading({ chainId, day, method, values, lower, upper, baseline, notes }, key);
      changed(chainId);
    };
    try {
      await removeReading(reading.id);
      changed(chainId);
      toastDone(`${readingWords(reading)} is removed.`, () => void putBack().catch(toastError));
    } catch (error) {
      toastError(error);
    }
  };
}
