import { Box, Heading, Link, Text } from '@chakra-ui/react';
import type { Accuracy } from '@halfpitch/contracts';
import { Link as RouterLink } from 'react-router-dom';
import { spanWords } from '../../app/format';
import { useFormat } from '../../app/use-format';
import { DataTable } from '../../components/data-table';
import type { Column } from '../../components/data-table';
import { judgedWords, seenWords, verdictWords } from './score-words';

type Look = Accuracy['latest'][number];

function told({ p10, p90 }: Look, today: string): string {
  if (p10 === null) return 'Not within two years';
  return p90 === null ? `From ${spanWords(p10, p10, today)} on` : spanWords(p10, p90, today);
}

/** The newest windows that were judged, one by one. */
export function LatestTable({ looks }: { looks: Look[] }) {
  const { day, today } = useFormat();
  const columns: Column<Look>[] = [
    {
      head: 'Chain',
      rowHead: true,
      cell: (look) => (
        <>
          <Link asChild>
            <RouterLink to={`/chains/${look.chainId}`}>{look.label}</RouterLink>
          </Link>
          <Text color="fg.muted" fontWeight="normal" textStyle="sm">
            {look.riderName}
          </Text>
        </>
      ),
    },
    { head: 'Treatment', cell: ({ kind }) => judgedWords(kind) },
    { head: 'Said', cell: (look) => `${told(look, today)} (on ${day(look.toldOn)})` },
    { head: 'Found', cell: (look) => `${seenWords[look.seen]} on ${day(look.day)}` },
    { head: 'So', cell: ({ verdict }) => verdictWords[verdict] },
  ];
  return (
    <Box>
      <Heading as="h2" size="lg" mb="3">
        The newest, as told two weeks before
      </Heading>
      <DataTable
        caption="The newest windows judged"
        columns={columns}
        rows={looks}
        rowKey={({ chainId, day: on }) => `${chainId} ${on}`}
      />
    </Box>
  );
}
