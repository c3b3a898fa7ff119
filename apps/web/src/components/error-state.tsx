import { Box, Button, Heading, Text } from '@chakra-ui/react';
import { ApiProblem, errorSentence } from '../app/api-problem';

interface ErrorStateProps {
  error: unknown;
  onRetry?: () => void;
  retryLabel?: string;
}

/** What went wrong in a plain sentence, and the way to try again. */
export function ErrorState({ error, onRetry, retryLabel = 'Try again' }: ErrorStateProps) {
  const title = error instanceof ApiProblem ? error.title : 'It did not work';
  return (
    <Box
      role="alert"
      p="6"
      my="4"
      maxWidth="36rem"
      mx="auto"
      bg="bg.panel"
      borderWidth="1px"
      borderRadius="l3"
    >
      <Heading as="h2" size="lg">
        {title}
      </Heading>
      <Text mt="2" color="fg.muted">
        {errorSentence(error)}
      </Text>
      {onRetry && (
        <Button mt="5" variant="outline" onClick={onRetry}>
          {retryLabel}
        </Button>
      )}
    </Box>
  );
}
