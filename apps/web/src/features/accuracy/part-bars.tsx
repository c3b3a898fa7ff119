import { Box, chakra, Flex, Text } from '@chakra-ui/react';
import { percent } from '../../app/format';
import { partWords } from './score-words';

const PROMISED = [0.1, 0.4, 0.4, 0.1];
/** Outside the window pale, inside it as dark as the due window is there. */
const grounds = ['bg.emphasized', 'steel.solid', 'steel.solid', 'bg.emphasized'];
const inks = ['fg', 'steel.contrast', 'steel.contrast', 'fg'];

const Row = chakra('tr');
const Head = chakra('th');
const Cell = chakra('td');

function Strip({ parts }: { parts: readonly number[] }) {
  return (
    <Flex height="2.25rem" gap="2px" aria-hidden="true">
      {parts.map((share, part) => (
        <Flex
          key={partWords[part]}
          flexGrow={share}
          flexBasis="0"
          minWidth="2px"
          bg={grounds[part]}
          color={inks[part]}
          borderWidth="1px"
          borderColor="border.emphasized"
          align="center"
          justify="center"
          overflow="hidden"
        >
          {share >= 0.06 && <Text textStyle="sm">{percent(share)}</Text>}
        </Flex>
      ))}
    </Flex>
  );
}

/** Where due days fell in their windows, beside where they should: two strips, and the same as a table. */
export function PartBars({ parts }: { parts: readonly number[] }) {
  return (
    <Box>
      <Text fontWeight="semibold" mb="1">
        Promised
      </Text>
      <Strip parts={PROMISED} />
      <Text fontWeight="semibold" mb="1" mt="3">
        Found
      </Text>
      <Strip parts={parts} />
      <chakra.table width="full" mt="4" textStyle="sm">
        <caption>
          <Text srOnly>Where due days fell in their windows</Text>
        </caption>
        <thead>
          <Row>
            <Head textAlign="start">It fell due</Head>
            <Head textAlign="end">Promised</Head>
            <Head textAlign="end">Found</Head>
          </Row>
        </thead>
        <tbody>
          {parts.map((share, part) => (
            <Row key={partWords[part]} borderTopWidth="1px">
              <Head textAlign="start" fontWeight="normal" py="1.5">
                {partWords[part]}
              </Head>
              <Cell textAlign="end">{percent(PROMISED[part]!)}</Cell>
              <Cell textAlign="end">{percent(share)}</Cell>
            </Row>
          ))}
        </tbody>
      </chakra.table>
    </Box>
  );
}
