import { Text } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useFormat } from '../../app/use-format';
import { DataTable } from '../../components/data-table';
import { Loaded } from '../../components/loaded';
import { fittingsQuery } from './api/fittings';

/** On which bike it was, and when. */
export function FittingTable({ chainId }: { chainId: string }) {
  const { day } = useFormat();
  const [page, setPage] = useState(1);
  const fittings = useQuery(fittingsQuery(chainId, page));
  return (
    <Loaded query={fittings} height="3rem">
      {(found) =>
        found.total === 0 ? (
          <Text color="fg.muted">It was on no bike yet.</Text>
        ) : (
          <DataTable
            caption="On which bike it was"
            rows={found.items}
            rowKey={({ id }) => id}
            columns={[
              { head: 'Bike', rowHead: true, cell: ({ bikeName }) => bikeName },
              { head: 'From', cell: ({ from }) => day(from) },
              { head: 'To', cell: ({ to }) => (to ? day(to) : 'now') },
            ]}
            paging={{ ...found, onPage: setPage }}
          />
        )
      }
    </Loaded>
  );
}
