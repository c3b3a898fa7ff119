import { Text } from '@chakra-ui/react';
import type { EstimationModel } from '@halfpitch/contracts';
import { DataTable } from '../../components/data-table';
import type { Column } from '../../components/data-table';
import { bikeKindWords, regimeWords } from '../../components/trade-words';

type Rate = EstimationModel['rates'][number];

const figure = (value: number) => `${value.toFixed(3)} %`;
const columns: Column<Rate>[] = [
  { head: 'Lubricant', rowHead: true, cell: ({ regime }) => regimeWords[regime] },
  { head: 'Bike', cell: ({ bikeKind }) => bikeKindWords[bikeKind] },
  { head: 'Start', numeric: true, cell: ({ start }) => figure(start) },
  { head: 'Here', numeric: true, cell: ({ median }) => figure(median) },
  { head: 'Chains', numeric: true, cell: ({ chains }) => chains },
];

/** How fast chains lengthen here, beside what every workshop starts from. */
export function LearnedRates({ rates }: { rates: Rate[] }) {
  if (rates.length === 0)
    return (
      <Text color="fg.muted">
        No chain has been measured here yet, so every new chain starts from common practice: 0.04 % for each
        1,000 counted km on immersion wax, 0.08 % on drip wax, 0.12 % on oil.
      </Text>
    );
  return (
    <>
      <DataTable
        caption="How fast chains lengthen here"
        columns={columns}
        rows={rates}
        rowKey={({ regime, bikeKind }) => `${regime} ${bikeKind}`}
      />
      <Text mt="2" color="fg.muted" textStyle="sm">
        Lengthening for each 1,000 counted km, as measured chains of the workshop show it. A new chain starts
        there and leaves it as its own readings arrive.
      </Text>
    </>
  );
}
