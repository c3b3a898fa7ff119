import { Box, Skeleton, Stack } from '@chakra-ui/react';

/** Grey places where a list will stand; says "Loading" to those who can't see them. */
export function LoadingState({ rows = 4, height = '4.5rem' }: { rows?: number; height?: string }) {
  return (
    <Stack role="status" aria-label="Loading" gap="3">
      {Array.from({ length: rows }, (_, i) => (
        <Skeleton key={i} height={height} borderRadius="l3" />
      ))}
    </Stack>
  );
}

/** A whole page still to come. */
export function PageLoading() {
  return (
    <Box maxWidth="44rem" mx="auto" p="4" pt="8">
      <Skeleton height="2.25rem" width="14rem" maxWidth="70%" mb="8" />
      <LoadingState />
    </Box>
  );
}
