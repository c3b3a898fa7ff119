import { Button, SimpleGrid, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { useWatch } from 'react-hook-form';
import { NumberField } from '../../components/fields/number-field';
import { SelectField } from '../../components/fields/select-field';
import { fractions } from './fractions';
import type { Entry } from './reading-form';
import { MOST_PLACES } from './reading-form';

const FIRST = 3;

/** What the tool shows at each place; those left empty do not count. */
export function PlaceFields() {
  const entry = useWatch({ name: 'entry' }) as Entry;
  const [shown, setShown] = useState(FIRST);
  const places = Array.from({ length: shown }, (_, i) => i);
  return (
    <Stack gap="4" align="flex-start">
      {entry === 'mm' && (
        <NumberField name="pitches" label="Over how many pitches" help="24 on a 12-inch rule" decimals={0} />
      )}
      <SimpleGrid columns={{ base: 1, sm: 3 }} gap="4" width="full">
        {places.map((i) =>
          entry === 'inch' ? (
            <SelectField
              key={`inch-${i}`}
              name={`inches.${i}`}
              label={`Place ${i + 1}`}
              placeholder="Not measured"
              options={fractions}
            />
          ) : (
            <NumberField
              key={`${entry}-${i}`}
              name={`places.${i}`}
              label={`Place ${i + 1}`}
              unit={entry === 'mm' ? 'mm' : '%'}
            />
          ),
        )}
      </SimpleGrid>
      {shown < MOST_PLACES && (
        <Button variant="outline" size="sm" onClick={() => setShown(shown + 1)}>
          Another place
        </Button>
      )}
    </Stack>
  );
}
