import { SimpleGrid, Text } from '@chakra-ui/react';
import { regimes } from '@halfpitch/contracts';
import { NumberField } from '../../components/fields/number-field';
import { Panel } from '../../components/panel';
import { regimeWords } from '../../components/trade-words';

/** After how many days a treatment is redone, however little was ridden. */
export function LimitSettings() {
  return (
    <Panel title="Calendar limits">
      <Text color="fg.muted" mb="5" maxWidth="42rem">
        A treatment is due after so many days at the latest, however little was ridden. Leave empty for no
        limit.
      </Text>
      <SimpleGrid minChildWidth="11rem" gap="4">
        {regimes.map((regime) => (
          <NumberField
            key={regime}
            name={`calendarLimitDays.${regime}`}
            label={regimeWords[regime]}
            unit="days"
            whole
            placeholder="no limit"
          />
        ))}
      </SimpleGrid>
    </Panel>
  );
}
