import { Button, Stack, Text } from '@chakra-ui/react';
import { Notice } from '../../components/notice';

const NAMED = 12;

/** What had not been sent when the page was left. A browser may not open a file again by itself. */
export function UnsentNotice({ names, onForget }: { names: readonly string[]; onForget: () => void }) {
  if (names.length === 0) return null;
  const more = names.length - NAMED;
  return (
    <Notice>
      <Stack gap="2" align="flex-start">
        <Text fontWeight="semibold">
          {names.length === 1 ? 'One file was' : `${names.length} files were`} not sent when you left this
          page
        </Text>
        <Text overflowWrap="anywhere">
          {names.slice(0, NAMED).join(', ')}
          {more > 0 && ` and ${more} more`}
        </Text>
        <Text>Choose them again, or the whole folder: what is there already is not counted twice.</Text>
        <Button size="sm" variant="outline" onClick={onForget}>
          Leave them out
        </Button>
      </Stack>
    </Notice>
  );
}
