import { Text } from '@chakra-ui/react';
import { surfaces } from '@halfpitch/contracts';
import type { WorkshopSettings } from '@halfpitch/contracts';
import { DataTable } from '../../components/data-table';
import type { Column } from '../../components/data-table';
import { Panel } from '../../components/panel';
import { surfaceWords, weatherWords } from '../../components/trade-words';
import { countedFor, times } from './counted';

type Factors = WorkshopSettings['factors'];
interface Row {
  word: string;
  lube: number;
  wear: number;
}

const weathers = ['dry', 'damp', 'wet', 'mud'] as const;
const columns: Column<Row>[] = [
  { head: 'Ridden', rowHead: true, cell: ({ word }) => word },
  { head: 'Counts for the treatment', numeric: true, cell: ({ lube }) => times(lube) },
  { head: 'Counts for wear', numeric: true, cell: ({ wear }) => times(wear) },
];
const EXAMPLE_KM = 40;

/** The two distances, with the workshop's factors and an example worked out from them. */
export function HowDistance({ factors }: { factors: Factors }) {
  const wet = countedFor(EXAMPLE_KM, factors, 'gravel', 'wet');
  const rows = [
    ...surfaces.map((one) => ({ word: surfaceWords[one], ...factors.surface[one] })),
    ...weathers.map((one) => ({
      word: `In the ${weatherWords[one].toLowerCase()}`,
      ...factors.weather[one],
    })),
  ];
  return (
    <Panel title="1. A hard kilometre counts for more">
      <Text mb="4">
        A kilometre on a dry, clean road counts once. Rain, mud and rough ground use wax and oil up faster,
        and grind the chain. Surface and weather multiply: {EXAMPLE_KM} km of wet gravel count as {wet.lube}{' '}
        km for the treatment and {wet.wear} km for wear. Where the weather is not known, it is taken as partly
        wet, by the month. Kilometres that only the odometer knows are spread over the days between and count
        too.
      </Text>
      <DataTable
        caption="What a kilometre counts for here"
        columns={columns}
        rows={rows}
        rowKey={({ word }) => word}
      />
    </Panel>
  );
}
