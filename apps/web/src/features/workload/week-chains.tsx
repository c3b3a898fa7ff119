import { Flex, Link, Stack, Text } from '@chakra-ui/react';
import { Link as RouterLink } from 'react-router-dom';
import { chance } from '../../app/format';
import { useFormat } from '../../app/use-format';
import { Panel } from '../../components/panel';
import { weekWords } from './week-words';
import type { Week } from './week-words';

/** The server names at most so many of a week. */
const MOST = 20;

/** Who makes up a week, likeliest first. */
export function WeekChains({ week }: { week: Week }) {
  const { today } = useFormat();
  return (
    <Panel title={`Who makes up ${weekWords(week, today).replace('This', 'this')}`}>
      {week.chains.length === 0 && <Text>Nobody is likely to fall due in it.</Text>}
      <Stack as="ol" listStyleType="none" gap="0" aria-live="polite">
        {week.chains.map((one) => (
          <Flex
            as="li"
            key={`${one.chainId} ${one.kind}`}
            justify="space-between"
            gap="4"
            py="2.5"
            borderTopWidth="1px"
            _first={{ borderTopWidth: 0 }}
          >
            <div>
              <Link asChild fontWeight="semibold">
                <RouterLink to={`/chains/${one.chainId}`}>{one.riderName}</RouterLink>
              </Link>
              <Text color="fg.muted" textStyle="sm">
                {one.label}, {one.kind === 'replacement' ? 'replacement' : 'treatment'}
              </Text>
            </div>
            <Text whiteSpace="nowrap" fontVariantNumeric="tabular-nums">
              {chance(one.chance)}
            </Text>
          </Flex>
        ))}
      </Stack>
      {week.chains.length === MOST && (
        <Text mt="3" color="fg.muted" textStyle="sm">
          The {MOST} likeliest; others may come too.
        </Text>
      )}
    </Panel>
  );
}
