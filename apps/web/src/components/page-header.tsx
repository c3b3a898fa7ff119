import { Flex, Heading, Text } from '@chakra-ui/react';
import type { ReactNode } from 'react';

interface PageHeaderProps {
  title: string;
  /** A line above or below that places the page: rider, bike, workshop. */
  lead?: ReactNode;
  /** Buttons for what is done most here. */
  actions?: ReactNode;
}

/** Names the page, in the window too. */
export function PageHeader({ title, lead, actions }: PageHeaderProps) {
  return (
    <Flex as="header" wrap="wrap" gap="4" justify="space-between" align="flex-end" mb={{ base: 5, md: 8 }}>
      <title>{`${title} · Halfpitch`}</title>
      <div>
        <Heading as="h1" size={{ base: '2xl', md: '3xl' }}>
          {title}
        </Heading>
        {lead && (
          <Text as="div" color="fg.muted" mt="1" maxWidth="42rem">
            {lead}
          </Text>
        )}
      </div>
      {actions && (
        <Flex gap="3" wrap="wrap" className="no-print">
          {actions}
        </Flex>
      )}
    </Flex>
  );
}
