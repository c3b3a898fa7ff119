import { Box, Heading, Text } from '@chakra-ui/react';
import type { WindowScore } from '@halfpitch/contracts';
import { DataTable } from '../../components/data-table';
import type { Column } from '../../components/data-table';
import { heldWords } from './score-words';

export interface ScoreRow {
  key: string;
  name: string;
  score: WindowScore;
}

const figure = (head: string, of: (score: WindowScore) => number): Column<ScoreRow> => ({
  head,
  numeric: true,
  cell: ({ score }) => of(score),
});

/** Windows counted by how they did, one row for each way of grouping them. */
export function ScoreTable({ title, first, rows }: { title: string; first: string; rows: ScoreRow[] }) {
  const columns: Column<ScoreRow>[] = [
    { head: first, rowHead: true, cell: ({ name }) => name },
    figure('Windows', ({ cases }) => cases),
    figure('Held', ({ held }) => held),
    figure('Due sooner', ({ sooner }) => sooner),
    figure('Lasted longer', ({ later }) => later),
    figure('Can’t tell', ({ open }) => open),
    {
      head: 'Held, of known due days',
      numeric: true,
      cell: ({ score }) => <Text whiteSpace="nowrap">{heldWords(score)}</Text>,
    },
  ];
  return (
    <Box>
      <Heading as="h2" size="lg" mb="3">
        {title}
      </Heading>
      <DataTable caption={title} columns={columns} rows={rows} rowKey={({ key }) => key} />
    </Box>
  );
}
