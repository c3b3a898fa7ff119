import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { tableStyles } from './data-table-styles';
import { Paging } from './paging';

export interface Column<T> {
  /** Its heading; on phones it stands before the value. */
  head: string;
  cell: (row: T) => ReactNode;
  /** Figures stand to the right. */
  numeric?: boolean;
  /** Names the row: the first line of its card on phones. */
  rowHead?: boolean;
}

interface DataTableProps<T> {
  /** What the table lists, for those who hear the page. */
  caption: string;
  columns: readonly Column<T>[];
  rows: readonly T[];
  rowKey: (row: T) => string;
  /** With paging: the page shown and how to show another. */
  paging?: { page: number; size: number; total: number; onPage: (page: number) => void };
}

const Cell = chakra('td');
const Head = chakra('th');

/** A table on wide screens, a card for each row on phones; one and the same markup. */
export function DataTable<T>({ caption, columns, rows, rowKey, paging }: DataTableProps<T>) {
  return (
    <>
      <chakra.table css={tableStyles} role="table">
        <chakra.caption srOnly>{caption}</chakra.caption>
        <thead role="rowgroup">
          <tr role="row">
            {columns.map(({ head, numeric }) => (
              <Head key={head} role="columnheader" scope="col" textAlign={numeric ? 'end' : 'start'}>
                {head}
              </Head>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup">
          {rows.map((row) => (
            <tr key={rowKey(row)} role="row">
              {columns.map(({ head, cell, numeric, rowHead }) =>
                rowHead ? (
                  <th key={head} role="rowheader" scope="row">
                    {cell(row)}
                  </th>
                ) : (
                  <Cell key={head} role="cell" data-head={head} textAlign={{ md: numeric ? 'end' : 'start' }}>
                    {cell(row)}
                  </Cell>
                ),
              )}
            </tr>
          ))}
        </tbody>
      </chakra.table>
      {paging && <Paging {...paging} />}
    </>
  );
}
