import { IconButton, Text } from '@chakra-ui/react';
import type { ChainEstimate, Reading } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { Trash2 } from 'lucide-react';
import { useState } from 'react';
import { useSession } from '../../app/session';
import { useFormat } from '../../app/use-format';
import { DataTable } from '../../components/data-table';
import { Loaded } from '../../components/loaded';
import { methodWords } from '../../components/trade-words';
import { readingsQuery } from './api/readings';
import { readingWords } from './reading-words';
import { useRemoveReading } from './use-remove-reading';

interface ReadingTableProps {
  chainId: string;
  doubted: ChainEstimate['elongation']['doubted'];
}

/** What was measured, with what, and what does not fit. */
export function ReadingTable({ chainId, doubted }: ReadingTableProps) {
  const { day } = useFormat();
  const { role, account } = useSession();
  const [page, setPage] = useState(1);
  const readings = useQuery(readingsQuery(chainId, page));
  const remove = useRemoveReading();
  const doubt = ({ id }: Reading) => doubted.find(({ readingId }) => readingId === id)?.because;
  const mayRemove = ({ by }: Reading) => role !== 'rider' || by === account.name;
  return (
    <Loaded query={readings} height="3rem">
      {(found) =>
        found.total === 0 ? (
          <Text color="fg.muted">
            No reading yet: the first one makes the window for replacement much narrower.
          </Text>
        ) : (
          <DataTable
            caption="Readings"
            rows={found.items}
            rowKey={({ id }) => id}
            columns={[
              { head: 'Elongation', rowHead: true, cell: readingWords },
              { head: 'Day', cell: (row) => day(row.day) },
              {
                head: 'Tool',
                cell: ({ method, baseline }) => methodWords[method] + (baseline ? ', new' : ''),
              },
              { head: 'Doubt', cell: (row) => doubt(row) ?? '–' },
              {
                head: 'By',
                cell: (row) => (
                  <>
                    {row.by}
                    {mayRemove(row) && (
                      <IconButton
                        variant="ghost"
                        aria-label={`Remove the reading of ${day(row.day)}`}
                        onClick={() => void remove(row)}
                      >
                        <Trash2 size={18} aria-hidden="true" />
                      </IconButton>
                    )}
                  </>
                ),
              },
            ]}
            paging={{ ...found, onPage: setPage }}
          />
        )
      }
    </Loaded>
  );
}
