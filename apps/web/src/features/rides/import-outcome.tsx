import { List, Text } from '@chakra-ui/react';
import type { RideImport } from '@halfpitch/contracts';
import { importWords } from './import-words';

/** What was added, what was there already, what was not taken and why. */
export function ImportOutcome({ found }: { found: RideImport }) {
  const { state, message, problems, otherSport, refused } = found;
  const failed = state === 'failed';
  const unread = failed && otherSport === 0;
  const others = problems.filter((problem) => problem.message !== message);
  const unnamed = refused - problems.length;
  return (
    <>
      <Text color={unread ? 'fg.error' : undefined}>{failed && message ? message : importWords(found)}</Text>
      {!failed && message && message !== importWords(found) && <Text color="fg.muted">{message}</Text>}
      {others.length > 0 && (
        <List.Root listStyle="none" mt="2" gap="1" color="fg.muted" textStyle="sm" overflowWrap="anywhere">
          {others.map(({ line, message: why }, i) => (
            <List.Item key={i}>
              {line !== null && `Line ${line}: `}
              {why}
            </List.Item>
          ))}
          {unnamed > 0 && <List.Item>… and {unnamed.toLocaleString('en-GB')} more.</List.Item>}
        </List.Root>
      )}
    </>
  );
}
