import type { ReadingInput } from '@halfpitch/contracts';
import { toastDone, toastError } from '../../components/toaster';
import { useChanged } from '../chains/follow-estimate';
import { useOnceKey } from '../rides/use-once-key';
import { addReading } from './api/add-reading';
import { removeReading } from './api/remove-reading';
import { readingWords } from './reading-words';

/** Saves a reading, tells so, and lets it be taken back. */
export function useEnterReading() {
  const changed = useChanged();
  const once = useOnceKey();
  return async (input: ReadingInput, label: string) => {
    const reading = await addReading(input, once.keyFor(input));
    once.accepted();
    changed(reading.chainId);
    const undo = async () => {
      await removeReading(reading.id);
      changed(reading.chainId);
      toastDone('The reading is taken back.');
    };
    toastDone(`${label}: ${readingWords(reading)} is noted.`, () => void undo().catch(toastError));
  };
}
