import { Button, Flex, Stack, Text } from '@chakra-ui/react';
import type { ReadingMethod } from '@halfpitch/contracts';
import { useFormContext, useWatch } from 'react-hook-form';
import { NumberField } from '../../components/fields/number-field';
import { RuleHelp } from './rule-help';

const MOST = 5;

const hints: Partial<Record<ReadingMethod, string>> = {
  'two-point':
    'A two-point gauge adds the rollers’ own play; the estimate allows for it. Enter what it shows.',
  'three-point': 'Enter what the gauge shows.',
  digital: 'Enter what the gauge shows.',
};

/** One to five places along the chain; the worst of them rules. */
export function PlaceFields({ method }: { method: ReadingMethod }) {
  const { setValue } = useFormContext();
  const values = useWatch({ name: 'reading.values' }) as (number | null)[];
  return (
    <Stack gap="3">
      {method === 'steel-rule' && <RuleHelp />}
      <Flex gap="4" wrap="wrap" align="flex-start">
        {values.map((_, i) => (
          <div key={i}>
            <NumberField name={`reading.values.${i}`} label={`Place ${i + 1}`} unit="%" decimals={3} />
          </div>
        ))}
      </Flex>
      <Text color="fg.muted" textStyle="sm">
        {hints[method]} {values.length > 1 && 'The worst place rules.'}
      </Text>
      {values.length < MOST && (
        <Button
          variant="outline"
          alignSelf="flex-start"
          onClick={() => setValue('reading.values', [...values, null])}
        >
          Another place
        </Button>
      )}
    </Stack>
  );
}
