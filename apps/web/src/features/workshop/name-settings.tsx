import { SimpleGrid } from '@chakra-ui/react';
import { SelectField } from '../../components/fields/select-field';
import { TextField } from '../../components/fields/text-field';
import { Panel } from '../../components/panel';

const zones = [...new Set(['UTC', ...Intl.supportedValuesOf('timeZone')])].sort();
const zoneOptions = zones.map((value) => ({ value, label: value.replaceAll('_', ' ') }));
const currencyNames = new Intl.DisplayNames('en-GB', { type: 'currency' });
const currencyOptions = Intl.supportedValuesOf('currency').map((value) => ({
  value,
  label: `${value}, ${currencyNames.of(value) ?? value}`,
}));

export function NameSettings() {
  return (
    <Panel title="The workshop">
      <SimpleGrid columns={{ base: 1, md: 2 }} gap="5">
        <TextField name="name" label="Name" help="It stands at the head of every letter." />
        <TextField name="town" label="Town" />
        <SelectField
          name="timeZone"
          label="Time zone"
          help="Days begin and end by it."
          options={zoneOptions}
        />
        <SelectField name="currency" label="Currency" options={currencyOptions} />
      </SimpleGrid>
    </Panel>
  );
}
