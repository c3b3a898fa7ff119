import { Box, Heading, HStack, Stack, Text } from '@chakra-ui/react';
import type { TreatmentInput } from '@halfpitch/contracts';
import { TriangleAlert } from 'lucide-react';
import { cautionsFor } from './cautions';

/** What to mind while doing it, in view as long as the treatment is chosen. */
export function CautionBox({ kind }: { kind: TreatmentInput['kind'] }) {
  return (
    <Box
      as="aside"
      aria-label="Cautions"
      p="5"
      bg="bg.panel"
      borderWidth="1px"
      borderColor="border.control"
      borderInlineStartWidth="6px"
      borderInlineStartColor="dryness.dry"
      borderRadius="l2"
    >
      <HStack gap="2" mb="3">
        <TriangleAlert size={22} aria-hidden="true" />
        <Heading as="h2" size="md">
          Mind
        </Heading>
      </HStack>
      <Stack as="dl" gap="3">
        {cautionsFor(kind).map(({ about, text }) => (
          <Box key={about}>
            <Text as="dt" fontWeight="semibold">
              {about}
            </Text>
            <Text as="dd">{text}</Text>
          </Box>
        ))}
      </Stack>
    </Box>
  );
}
