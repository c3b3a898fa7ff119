import { List, Text } from '@chakra-ui/react';
import type { RideImport } from '@halfpitch/contracts';
import { importWords } from './import-words';

/** What was added, what was there already, what was not taken and why. */
export function ImportOutcome({ found }: { found: RideImport }) {
  const { state, message, problems } = found;
  const failed = state === 'failed';
  const others = problems.filter((problem) => problem.message !== message);
  return (
    <>
      <Text color={failed ? 'fg.error' : undefined}>{failed && message ? message : importWords(found)}</Text>
      {!failed && message && message !== importWords(found) && <Text color="fg.muted">{message}</Text>}
      {others.length > 0 && (
        <List.Root listStyle="none" mt="2" gap="1" color="fg.muted" textStyle="sm">
          {others.map(({ line, message: why }, i) => (
            <List.Item key={i}>
              {line !== null && `Line ${line}: `}
              {why}
            </List.Item>
          ))}
        </List.Root>
      )}
    </>
  );
}
