import { Stack } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { DataTable } from '../../components/data-table';
import { EmptyState } from '../../components/empty-state';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { SearchBox } from '../../components/search-box';
import { usePageNumber, useUrlState } from '../../components/use-url-state';
import { chainsQuery } from '../bench/api/chains';
import { remindersQuery } from '../reminders/api/reminders';
import { newestBySubject } from '../reminders/reminder-words';
import { dueColumns } from './due-columns';
import { dueRows } from './due-rows';

/** The newest letters, and all that are held however old: what a chain's row needs to know; until it does, the query it waits for. */
function useReminderOf() {
  const newest = useQuery({ ...remindersQuery({ size: 200 }), refetchInterval: 20_000 });
  const held = useQuery(remindersQuery({ state: 'held', size: 200 }));
  const reminderOf = useMemo(
    () => newest.data && held.data && newestBySubject([...newest.data.items, ...held.data.items]),
    [newest.data, held.data],
  );
  return { reminderOf, waitsFor: newest.data ? held : newest };
}

/** Who is due soonest, what was written to them, and the way to write or hold. */
export function Due() {
  const [search] = useUrlState('search');
  const [page, onPage] = usePageNumber();
  const query = useQuery(chainsQuery({ order: 'soonest', search, page, size: 25 }));
  const { reminderOf, waitsFor } = useReminderOf();
  const columns = useMemo(() => reminderOf && dueColumns(reminderOf), [reminderOf]);
  return (
    <>
      <PageHeader
        title="Due"
        lead="Whose chain falls due soonest, and what was written to them. Letters go out by themselves at night; here you can write at once, or hold one back."
      />
      <Stack gap="5">
        <SearchBox label="Find a chain" placeholder="Rider, bike or chain" />
        <Loaded query={query} rows={8} height="4rem">
          {(data) =>
            data.total === 0 ? (
              <EmptyState title={search ? `Nothing fits “${search}”` : 'No chain is in service yet'}>
                {search
                  ? 'Try a part of the rider’s name, the bike or the chain.'
                  : 'Add a rider, a bike and its chain.'}
              </EmptyState>
            ) : columns ? (
              <DataTable
                caption="Chains by the day they fall due"
                columns={columns}
                rows={dueRows(data.items)}
                rowKey={({ key }) => key}
                paging={{ ...data, onPage }}
              />
            ) : (
              <Loaded query={waitsFor} rows={8} height="4rem">
                {() => null}
              </Loaded>
            )
          }
        </Loaded>
      </Stack>
    </>
  );
}
