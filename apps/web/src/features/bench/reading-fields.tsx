import { Stack, Text } from '@chakra-ui/react';
import { readingMethods } from '@halfpitch/contracts';
import { useWatch } from 'react-hook-form';
import { ChoiceTiles } from '../../components/fields/choice-tiles';
import { useFieldError } from '../../components/fields/use-field-error';
import { methodWords } from '../../components/trade-words';
import { PlaceFields } from './place-fields';
import { dropInSteps } from './treatment-form';
import type { TreatmentForm } from './treatment-form';

const methods = [
  { value: 'none', label: 'Not measured' },
  ...readingMethods.map((value) => ({ value, label: methodWords[value] })),
];

/** A reading taken with the treatment: figures, or what goes in and what does not. */
export function ReadingFields() {
  const method = useWatch({ name: 'reading.method' }) as TreatmentForm['reading']['method'];
  const wrong = useFieldError('reading.values');
  return (
    <Stack gap="5">
      <ChoiceTiles
        name="reading.method"
        label="Elongation, measured with"
        options={methods}
        minTileWidth="9rem"
      />
      {method === 'drop-in' && (
        <ChoiceTiles
          name="reading.step"
          label="What the gauge shows"
          options={dropInSteps}
          minTileWidth="12rem"
        />
      )}
      {method !== 'none' && method !== 'drop-in' && <PlaceFields method={method} />}
      {wrong && (
        <Text role="alert" color="fg.error" fontWeight="semibold" textStyle="sm">
          {wrong}
        </Text>
      )}
    </Stack>
  );
}
