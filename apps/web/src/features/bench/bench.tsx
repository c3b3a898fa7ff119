import { Stack } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { EmptyState } from '../../components/empty-state';
import { ErrorState } from '../../components/error-state';
import { LoadingState } from '../../components/loading-state';
import { PageHeader } from '../../components/page-header';
import { Paging } from '../../components/paging';
import { SearchBox } from '../../components/search-box';
import { usePageNumber, useUrlState } from '../../components/use-url-state';
import { chainsQuery } from './api/chains';
import { BenchRow } from './bench-row';

/** Every chain in service, the one due first at the top. */
export function Bench() {
  const [search] = useUrlState('search');
  const [page, onPage] = usePageNumber();
  const { data, error, refetch } = useQuery(chainsQuery({ order: 'soonest', search, page, size: 25 }));
  return (
    <>
      <PageHeader
        title="Bench"
        lead="Chains in service, due soonest first. Open one to record what you do."
      />
      <Stack gap="5">
        <SearchBox label="Find a chain" placeholder="Rider, bike or chain" />
        {error && !data && <ErrorState error={error} onRetry={() => void refetch()} />}
        {!data && !error && <LoadingState rows={6} height="7.5rem" />}
        {data?.total === 0 && (
          <EmptyState title={search ? `Nothing fits “${search}”` : 'No chain is in service yet'}>
            {search
              ? 'Try a part of the rider’s name, the bike or the chain’s label.'
              : 'Add a rider with a bike and a chain; it then stands here.'}
          </EmptyState>
        )}
        {data && data.total > 0 && (
          <Stack as="ul" gap="3" listStyleType="none">
            {data.items.map((chain) => (
              <BenchRow key={chain.id} chain={chain} />
            ))}
          </Stack>
        )}
      </Stack>
      {data && data.total > 0 && <Paging {...data} onPage={onPage} />}
    </>
  );
}
