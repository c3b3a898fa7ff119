import { Box, List, SimpleGrid, Text } from '@chakra-ui/react';
import type { DueWindow, Reason } from '@halfpitch/contracts';
import { reasonWords } from '../../app/format';
import { useFormat } from '../../app/use-format';
import { chanceWords } from './estimate-words';

/** How sure it is: the chance that it is due by then. */
export function Chances({ window }: { window: DueWindow }) {
  return (
    <Box>
      <Text fontWeight="semibold" mb="2">
        How likely it is due
      </Text>
      <SimpleGrid as="dl" columns={{ base: 2, sm: 4 }} gap="3">
        {chanceWords(window).map(([when, chance]) => (
          <Box key={when}>
            <Text as="dt" color="fg.muted" textStyle="sm">
              {when}
            </Text>
            <Text as="dd" m="0" textStyle="lg" fontVariantNumeric="tabular-nums">
              {chance}
            </Text>
          </Box>
        ))}
      </SimpleGrid>
    </Box>
  );
}

/** Why the window lies there, and what moved it since a week ago. */
export function Reasons({ reasons }: { reasons: readonly Reason[] }) {
  const { unit } = useFormat();
  if (reasons.length === 0) return null;
  return (
    <Box>
      <Text fontWeight="semibold" mb="1">
        Why
      </Text>
      <List.Root ps="5" gap="1">
        {reasons.map((reason) => (
          <List.Item key={reason.code}>{reasonWords(reason, unit)}</List.Item>
        ))}
      </List.Root>
    </Box>
  );
}
