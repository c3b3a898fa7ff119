import { SimpleGrid, Text } from '@chakra-ui/react';
import { NumberField } from '../../components/fields/number-field';
import { Panel } from '../../components/panel';
import { monthNames } from './month-names';

/** The share of wet rides by month, for rides whose weather nobody wrote down. */
export function WetShareSettings() {
  return (
    <Panel title="Wet rides by month">
      <Text color="fg.muted" mb="5" maxWidth="42rem">
        Where a ride’s weather is not known, it counts as so many parts wet and the rest dry. Take your own
        area’s share of wet days.
      </Text>
      <SimpleGrid minChildWidth="10.5rem" gap="4">
        {monthNames.map((month, i) => (
          <NumberField
            key={month}
            name={`factors.wetShareByMonth.${i}`}
            label={month}
            unit="%"
            scale={0.01}
            decimals={0}
          />
        ))}
      </SimpleGrid>
    </Panel>
  );
}
