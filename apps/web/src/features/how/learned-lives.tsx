import { Text } from '@chakra-ui/react';
import type { EstimationModel } from '@halfpitch/contracts';
import { useFormat } from '../../app/use-format';
import { DataTable } from '../../components/data-table';
import type { Column } from '../../components/data-table';
import { treatmentWords } from '../../components/trade-words';

type Life = EstimationModel['lives'][number];

/** How long each treatment is taken to last here, beside what every workshop starts from. */
export function LearnedLives({ model }: { model: EstimationModel }) {
  const { distance, day } = useFormat();
  const km = (value: number) => distance(1000 * value);
  const columns: Column<Life>[] = [
    { head: 'Treatment', rowHead: true, cell: ({ kind }) => treatmentWords[kind] },
    { head: 'Start', numeric: true, cell: ({ start }) => km(start) },
    {
      head: 'Here',
      numeric: true,
      cell: ({ median, observations }) => (observations === 0 ? 'as the start' : km(median)),
    },
    {
      head: '80 % span',
      numeric: true,
      cell: ({ low, high }) => (low === null || high === null ? '–' : `${km(low)} to ${km(high)}`),
    },
    { head: 'Arrivals', numeric: true, cell: ({ observations }) => observations },
  ];
  return (
    <>
      <DataTable
        caption="How long treatments last here"
        columns={columns}
        rows={model.lives}
        rowKey={({ kind }) => kind}
      />
      <Text mt="2" color="fg.muted" textStyle="sm">
        The counted distance after which half of such treatments are used up.{' '}
        {model.learnedOn
          ? `Learned on ${day(model.learnedOn)}, anew each week; eight of ten times the true figure lies in the span.`
          : 'Nothing was learned here yet: that happens once a week, at night.'}
      </Text>
    </>
  );
}
