import { SimpleGrid, Stack, Text } from '@chakra-ui/react';
import { NumberField } from '../../components/fields/number-field';
import { Panel } from '../../components/panel';
import { SwitchField } from './switch-field';

/** When a letter is written by itself. */
export function PolicySettings() {
  return (
    <Panel title="Reminders">
      <Text color="fg.muted" mb="5" maxWidth="42rem">
        Each night a rider is written to whose chain falls due within so many days with at least this chance;
        once for each treatment, and never a rider who has stopped the letters.
      </Text>
      <SimpleGrid columns={{ base: 1, md: 2 }} gap="5" mb="4">
        <NumberField name="reminderPolicy.days" label="Look ahead" unit="days" whole />
        <NumberField
          name="reminderPolicy.chance"
          label="Write from a chance of"
          unit="%"
          scale={0.01}
          decimals={0}
        />
      </SimpleGrid>
      <Stack gap="1" align="flex-start">
        <SwitchField name="reminderPolicy.lubrication" label="Write about wax and oil" />
        <SwitchField name="reminderPolicy.replacement" label="Write about worn chains" />
      </Stack>
    </Panel>
  );
}
