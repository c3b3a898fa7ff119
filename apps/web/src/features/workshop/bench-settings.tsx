import { SimpleGrid } from '@chakra-ui/react';
import { NumberField } from '../../components/fields/number-field';
import { Panel } from '../../components/panel';

/** What the week ahead is held against. */
export function BenchSettings() {
  return (
    <Panel title="Bench and pot">
      <SimpleGrid columns={{ base: 1, md: 2 }} gap="5">
        <NumberField
          name="bench.minutesPerWeek"
          label="Bench time a week"
          unit="minutes"
          whole
          help="For chains alone, all mechanics together."
        />
        <NumberField name="bench.chainsPerPotLoad" label="Chains in a pot load" unit="chains" whole />
        <NumberField name="bench.minutesPerTreatment" label="A treatment takes" unit="minutes" whole />
        <NumberField name="bench.minutesPerReplacement" label="A replacement takes" unit="minutes" whole />
      </SimpleGrid>
    </Panel>
  );
}
