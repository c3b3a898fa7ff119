import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { percent } from '../../app/format';
import { useFormat } from '../../app/use-format';
import { DataTable } from '../../components/data-table';
import { Loaded } from '../../components/loaded';
import { pastEstimatesQuery } from './api/past-estimates';

/** What was believed when: each day's estimate as it was then. */
export function BeliefTable({ chainId }: { chainId: string }) {
  const { instant, window } = useFormat();
  const [page, setPage] = useState(1);
  const past = useQuery(pastEstimatesQuery(chainId, page));
  return (
    <Loaded query={past} height="3rem">
      {(found) => (
        <DataTable
          caption="What was believed when"
          rows={found.items}
          rowKey={({ id }) => id}
          columns={[
            { head: 'Estimated', rowHead: true, cell: ({ madeAt }) => instant(madeAt) },
            { head: 'Used', numeric: true, cell: ({ shareUsed }) => percent(shareUsed) },
            {
              head: 'Treatment',
              cell: ({ lubrication }) => (lubrication ? window(lubrication) : 'in the box'),
            },
            { head: 'Replacement', cell: ({ replacement }) => window(replacement) },
          ]}
          paging={{ ...found, onPage: setPage }}
        />
      )}
    </Loaded>
  );
}
