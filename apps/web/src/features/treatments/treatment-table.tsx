import { Text } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useFormat } from '../../app/use-format';
import { DataTable } from '../../components/data-table';
import { Loaded } from '../../components/loaded';
import { arrivalWords, treatmentWords } from '../../components/trade-words';
import { treatmentsQuery } from './api/treatments';

/** What was done to a chain, and how it came in. */
export function TreatmentTable({ chainId }: { chainId: string }) {
  const { day } = useFormat();
  const [page, setPage] = useState(1);
  const treatments = useQuery(treatmentsQuery(chainId, page));
  return (
    <Loaded query={treatments} height="3rem">
      {(found) =>
        found.total === 0 ? (
          <Text color="fg.muted">No treatment is recorded yet: the workshop’s bench records them.</Text>
        ) : (
          <DataTable
            caption="Treatments"
            rows={found.items}
            rowKey={({ id }) => id}
            columns={[
              { head: 'Treatment', rowHead: true, cell: ({ kind }) => treatmentWords[kind] },
              { head: 'Day', cell: (row) => day(row.day) },
              { head: 'Came in', cell: ({ arrival }) => arrivalWords[arrival] },
              { head: 'By', cell: ({ by }) => by },
            ]}
            paging={{ ...found, onPage: setPage }}
          />
        )
      }
    </Loaded>
  );
}
