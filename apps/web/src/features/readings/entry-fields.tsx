import { useWatch } from 'react-hook-form';
import { PlaceFields } from './place-fields';
import type { Entry } from './reading-form';
import { StepFields } from './step-fields';

/** What the chosen tool shows. */
export function EntryFields() {
  const entry = useWatch({ name: 'entry' }) as Entry;
  return entry === 'steps' ? <StepFields /> : <PlaceFields />;
}
