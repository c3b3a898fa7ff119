import { Box, Heading } from '@chakra-ui/react';
import type { BoxProps } from '@chakra-ui/react';
import { useId } from 'react';

/** One subject on its own ground: a bike, a question and its answer. */
export function Panel({ title, children, ...box }: BoxProps & { title?: string }) {
  const heading = useId();
  return (
    <Box
      as="section"
      aria-labelledby={title && heading}
      bg="bg.panel"
      borderWidth="1px"
      borderRadius="l3"
      p={{ base: 4, sm: 6 }}
      {...box}
    >
      {title && (
        <Heading as="h2" size="xl" id={heading} mb="4">
          {title}
        </Heading>
      )}
      {children}
    </Box>
  );
}
