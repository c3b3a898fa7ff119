import { Button, Flex, Stack, Text } from '@chakra-ui/react';
import { inspectCsv } from '@halfpitch/ride-files';
import type { CsvInspection, CsvMatching, KnownMatching } from '@halfpitch/ride-files';
import { useMemo, useState } from 'react';
import { Notice } from '../../components/notice';
import { matchingWords } from './csv-words';
import { rideCount } from './import-words';
import { MatchingFields } from './matching-fields';
import { TablePreview } from './table-preview';

interface TableMatchingProps {
  bytes: Uint8Array;
  onAdd: (matching: CsvMatching) => void;
  onLeave: () => void;
}

function inspected(bytes: Uint8Array, said: KnownMatching): CsvInspection | string {
  try {
    return inspectCsv(bytes, said);
  } catch (error) {
    return error instanceof Error ? error.message : 'The table cannot be read.';
  }
}

/** How a table would be read, with its first rows as rides; nothing is saved before it is said to be right. */
export default function TableMatching({ bytes, onAdd, onLeave }: TableMatchingProps) {
  const [said, setSaid] = useState<KnownMatching>({});
  const found = useMemo(() => inspected(bytes, said), [bytes, said]);
  const [opened, setOpened] = useState(false);
  const leave = (
    <Button variant="outline" onClick={onLeave}>
      Leave it out
    </Button>
  );
  if (typeof found === 'string')
    return (
      <Stack gap="3" align="flex-start">
        <Text color="fg.error">{found}</Text>
        {leave}
      </Stack>
    );
  const { matching, questions, rows, problems } = found;
  const rides = rows - problems.length;
  const isOpen = opened || questions.length > 0;
  return (
    <Stack gap="4">
      <Text color="fg.muted">{matchingWords(matching, questions)}</Text>
      {questions.length > 0 && (
        <Notice>
          {questions.map(({ about, text }) => (
            <Text key={about}>{text}</Text>
          ))}
        </Notice>
      )}
      {isOpen ? (
        <MatchingFields
          found={found}
          onChange={(more) => {
            setOpened(true);
            setSaid({ ...said, ...more });
          }}
        />
      ) : (
        <Button variant="outline" alignSelf="flex-start" onClick={() => setOpened(true)}>
          Change how it is read
        </Button>
      )}
      {questions.every(({ about }) => about !== 'date' && about !== 'distance') && (
        <TablePreview found={found} />
      )}
      <Flex gap="3" wrap="wrap">
        <Button disabled={questions.length > 0 || rides === 0} onClick={() => onAdd(matching)}>
          {rides === 0 ? 'No ride to add' : `Add ${rideCount(rides)}`}
        </Button>
        {leave}
      </Flex>
    </Stack>
  );
}
