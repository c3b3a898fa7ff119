import { Box, Button, Flex, Heading, Skeleton, Text } from '@chakra-ui/react';
import { Suspense, useId, useRef, useState } from 'react';
import type { ReactNode } from 'react';
import { toCsv } from './csv';
import type { CsvValue } from './csv';
import { DataTable } from './data-table';
import { saveFile } from './save-file';
import { svgText } from './svg-text';

interface ChartFrameProps {
  title: string;
  /** What the chart says, in a sentence; also for those who do not see it. */
  summary: ReactNode;
  /** The figures: headings, then a row each, as the table and the file show them. */
  table: { head: readonly string[]; rows: readonly (readonly CsvValue[])[] };
  /** Name of the file without ending. */
  fileName: string;
  height?: string;
  /** The drawing, from a `lazy` component so that the charts' code comes only now. */
  children: ReactNode;
}

const cellText = (value: CsvValue | undefined) => (value === null || value === undefined ? '–' : value);

/** A chart with its sentence; the same figures as a table or a file. */
export function ChartFrame({ title, summary, table, fileName, height = '20rem', children }: ChartFrameProps) {
  const [asTable, setAsTable] = useState(false);
  const heading = useId();
  const chart = useRef<HTMLDivElement>(null);
  const saveCsv = () =>
    saveFile(`${fileName}.csv`, 'text/csv;charset=utf-8', '\uFEFF' + toCsv([table.head, ...table.rows]));
  const saveSvg = () => {
    const drawing = chart.current?.querySelector('svg');
    if (drawing) saveFile(`${fileName}.svg`, 'image/svg+xml', svgText(drawing));
  };
  const keyed = table.rows.map((cells, i) => ({ key: String(i), cells }));
  const columns = table.head.map((head, i) => ({
    head,
    rowHead: i === 0,
    numeric: i > 0,
    cell: ({ cells }: (typeof keyed)[number]) => cellText(cells[i]),
  }));
  return (
    <Box as="figure" aria-labelledby={heading} m="0">
      <Flex wrap="wrap" gap="3" justify="space-between" align="center">
        <Heading as="h2" size="lg" id={heading}>
          {title}
        </Heading>
        <Flex gap="2" className="no-print">
          <Button size="sm" variant="outline" onClick={() => setAsTable(!asTable)}>
            {asTable ? 'As a chart' : 'As a table'}
          </Button>
          <Button size="sm" variant="outline" onClick={saveCsv}>
            Save as CSV
          </Button>
          {!asTable && (
            <Button size="sm" variant="outline" onClick={saveSvg}>
              Save as SVG
            </Button>
          )}
        </Flex>
      </Flex>
      <Text as="figcaption" color="fg.muted" mt="1" mb="4">
        {summary}
      </Text>
      {asTable ? (
        <DataTable caption={title} columns={columns} rows={keyed} rowKey={({ key }) => key} />
      ) : (
        <Box ref={chart} height={height} aria-hidden="true">
          <Suspense fallback={<Skeleton height="full" />}>{children}</Suspense>
        </Box>
      )}
    </Box>
  );
}
