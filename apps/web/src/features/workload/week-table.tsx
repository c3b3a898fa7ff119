import { Box, Button, Heading, Text } from '@chakra-ui/react';
import type { Workload } from '@halfpitch/contracts';
import { useFormat } from '../../app/use-format';
import { DataTable } from '../../components/data-table';
import type { Column } from '../../components/data-table';
import { bandWords, fit, fitWords, weekWords } from './week-words';
import type { Band, Week } from './week-words';

interface WeekTableProps {
  load: Workload;
  chosen: string | undefined;
  onChoose: (from: string) => void;
}

const banded = (head: string, of: (week: Week) => Band): Column<Week> => ({
  head,
  numeric: true,
  cell: (week) => <Text whiteSpace="nowrap">{bandWords(of(week))}</Text>,
});

/** The weeks in figures; a week pressed shows who makes it up. */
export function WeekTable({ load, chosen, onChoose }: WeekTableProps) {
  const { today } = useFormat();
  const columns: Column<Week>[] = [
    {
      head: 'Week',
      rowHead: true,
      cell: (week) => (
        <Button
          size="sm"
          variant={week.from === chosen ? 'solid' : 'outline'}
          aria-pressed={week.from === chosen}
          onClick={() => onChoose(week.from)}
        >
          {weekWords(week, today)}
        </Button>
      ),
    },
    banded('Treatments', (week) => week.treatments),
    banded('Replacements', (week) => week.replacements),
    banded('Pot loads', (week) => week.potLoads),
    banded('Bench minutes', (week) => week.benchMinutes),
    {
      head: 'Bench',
      cell: ({ benchMinutes }) => {
        const word = fit(benchMinutes, load.minutesPerWeek);
        return <Text fontWeight={word === 'fits' ? undefined : 'semibold'}>{fitWords[word]}</Text>;
      },
    },
  ];
  return (
    <Box>
      <Heading as="h2" size="lg" mb="3">
        Week by week
      </Heading>
      <DataTable caption="The coming weeks" columns={columns} rows={load.weeks} rowKey={({ from }) => from} />
    </Box>
  );
}
