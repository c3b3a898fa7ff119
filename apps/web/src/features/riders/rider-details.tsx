import { Box, Link, Stack, Text } from '@chakra-ui/react';
import type { Rider } from '@halfpitch/contracts';
import { Panel } from '../../components/panel';

/** How to reach the rider, ready for the telephone. */
export function RiderDetails({ rider }: { rider: Rider }) {
  return (
    <Panel title="Details">
      <Stack as="dl" gap="3">
        <Box>
          <Text as="dt" color="fg.muted">
            E-mail
          </Text>
          <Text as="dd" overflowWrap="anywhere">
            <Link href={`mailto:${rider.email}`}>{rider.email}</Link>
          </Text>
        </Box>
        <Box>
          <Text as="dt" color="fg.muted">
            Phone
          </Text>
          <dd>{rider.phone ? <Link href={`tel:${rider.phone}`}>{rider.phone}</Link> : 'not known'}</dd>
        </Box>
        {rider.notes && (
          <Box>
            <Text as="dt" color="fg.muted">
              Notes
            </Text>
            <Text as="dd" whiteSpace="pre-wrap">
              {rider.notes}
            </Text>
          </Box>
        )}
      </Stack>
    </Panel>
  );
}
