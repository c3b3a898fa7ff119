import { Progress, Text } from '@chakra-ui/react';

/** How far a file is. */
export function ImportBar({ doing, share }: { doing: string; share: number }) {
  const hundredths = Math.round(share * 100);
  return (
    <Progress.Root value={hundredths} aria-label={doing}>
      <Progress.Track>
        <Progress.Range />
      </Progress.Track>
      <Text color="fg.muted" textStyle="sm" mt="1" aria-hidden="true">
        {doing}: {hundredths} %
      </Text>
    </Progress.Root>
  );
}
