import { Box, HStack } from '@chakra-ui/react';
import { Info, TriangleAlert } from 'lucide-react';
import type { ReactNode } from 'react';

interface NoticeProps {
  /** 'caution' where work can hurt someone or something; 'trouble' where something went wrong. */
  kind?: 'note' | 'caution' | 'trouble';
  children: ReactNode;
}

/** A few sentences that must not be missed. */
export function Notice({ kind = 'note', children }: NoticeProps) {
  const Sign = kind === 'note' ? Info : TriangleAlert;
  const edge = { note: 'steel.solid', caution: 'dryness.dry', trouble: 'fg.error' }[kind];
  return (
    <HStack
      role={kind === 'trouble' ? 'alert' : 'note'}
      align="flex-start"
      gap="3"
      p="4"
      bg="bg.muted"
      borderRadius="l2"
      borderInlineStartWidth="5px"
      borderColor={edge}
    >
      <Box color={edge} flexShrink="0" pt="0.5">
        <Sign size={20} aria-hidden="true" />
      </Box>
      <Box minWidth="0">{children}</Box>
    </HStack>
  );
}
