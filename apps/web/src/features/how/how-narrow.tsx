import { List, Text } from '@chakra-ui/react';
import { Panel } from '../../components/panel';

/** What makes a window narrower, most effective first. */
export function HowNarrow() {
  return (
    <Panel title="5. What narrows a window most">
      <List.Root as="ol" ps="5" gap="2">
        <List.Item>
          <strong>A reading with a three-point gauge</strong>, for the replacement. Each chain’s page says how
          much one would narrow its window now.
        </List.Item>
        <List.Item>
          <strong>Noting how the chain arrived</strong>, for wax and oil: it teaches how long a treatment
          lasts.
        </List.Item>
        <List.Item>
          <strong>Logging rides with their weather</strong>: two wet rides can use a treatment up.
        </List.Item>
        <List.Item>
          <strong>The odometer</strong> now and then: it finds kilometres that nobody logged.
        </List.Item>
        <List.Item>
          <strong>Planned riding</strong>: a training week moves the window before it happens.
        </List.Item>
      </List.Root>
      <Text mt="4" color="fg.muted">
        An estimate never replaces looking: the maker’s manual and the mechanic at the bench have the last
        word.
      </Text>
    </Panel>
  );
}
