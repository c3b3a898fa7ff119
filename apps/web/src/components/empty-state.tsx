import { Box, Heading, Text } from '@chakra-ui/react';
import type { ReactNode } from 'react';

interface EmptyStateProps {
  title: string;
  children?: ReactNode;
  /** The button that fills the emptiness. */
  action?: ReactNode;
}

/** Two open links: nothing is on the chain yet. */
function OpenLinks() {
  return (
    <svg
      width="96"
      height="32"
      viewBox="0 0 96 32"
      aria-hidden="true"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.5"
    >
      <path d="M14 5a11 11 0 0 1 6.5 2.1q3.5 2 7 0A11 11 0 1 1 27.5 24.9q-3.5-2-7 0A11 11 0 1 1 14 5z" />
      <path
        d="M62 5a11 11 0 0 1 6.5 2.1q3.5 2 7 0A11 11 0 1 1 75.5 24.9q-3.5-2-7 0A11 11 0 1 1 62 5z"
        strokeDasharray="3 3"
      />
      <circle cx="14" cy="16" r="4.5" />
      <circle cx="34" cy="16" r="4.5" />
      <circle cx="62" cy="16" r="4.5" strokeDasharray="3 3" />
      <circle cx="82" cy="16" r="4.5" strokeDasharray="3 3" />
    </svg>
  );
}

/** Says that nothing is here, why, and what to do about it. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <Box py="12" px="4" textAlign="center" color="fg.muted">
      <Box display="inline-block" color="border.control" mb="4">
        <OpenLinks />
      </Box>
      <Heading as="h2" size="xl" color="fg">
        {title}
      </Heading>
      {children && (
        <Text as="div" mt="2" mx="auto" maxWidth="32rem">
          {children}
        </Text>
      )}
      {action && <Box mt="6">{action}</Box>}
    </Box>
  );
}
