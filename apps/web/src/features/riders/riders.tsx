import { Button, Link, Stack, Text } from '@chakra-ui/react';
import { roleMay } from '@halfpitch/contracts';
import type { Rider } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { Link as RouterLink } from 'react-router-dom';
import { useSession } from '../../app/session';
import { DataTable } from '../../components/data-table';
import type { Column } from '../../components/data-table';
import { EmptyState } from '../../components/empty-state';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { SearchBox } from '../../components/search-box';
import { usePageNumber, useUrlState } from '../../components/use-url-state';
import { accessWords } from './access-words';
import { ridersQuery } from './api/riders';

const columns: Column<Rider>[] = [
  {
    head: 'Rider',
    rowHead: true,
    cell: (rider) => (
      <>
        <Link asChild>
          <RouterLink to={`/riders/${rider.id}`}>{rider.name}</RouterLink>
        </Link>
        <Text color="fg.muted" fontWeight="normal" overflowWrap="anywhere">
          {rider.email}
        </Text>
      </>
    ),
  },
  { head: 'Phone', cell: (rider) => <Text whiteSpace="nowrap">{rider.phone || '–'}</Text> },
  { head: 'Bikes', numeric: true, cell: (rider) => rider.bikes },
  { head: 'Chains', numeric: true, cell: (rider) => rider.chains },
  { head: 'Sign-in', cell: (rider) => accessWords[rider.access] },
  { head: 'Reminders', cell: (rider) => (rider.remindersOn ? 'On' : 'Off') },
];

/** Everyone the workshop looks after. */
export function Riders() {
  const { role } = useSession();
  const [search] = useUrlState('search');
  const [page, onPage] = usePageNumber();
  const query = useQuery(ridersQuery({ search, page, size: 25 }));
  const add = roleMay(role, 'riders.write') && (
    <Button asChild>
      <RouterLink to="/riders/new">Add a rider</RouterLink>
    </Button>
  );
  return (
    <>
      <PageHeader title="Riders" lead="Everyone whose chains you look after." actions={add} />
      <Stack gap="5">
        <SearchBox label="Find a rider" placeholder="Name, e-mail or phone" />
        <Loaded query={query} rows={8} height="3rem">
          {(data) =>
            data.total === 0 ? (
              <EmptyState
                title={search ? `Nobody fits “${search}”` : 'No riders yet'}
                action={!search && add}
              >
                {search
                  ? 'Try a part of the name or the address.'
                  : 'Add the first one, then a bike and its chain.'}
              </EmptyState>
            ) : (
              <DataTable
                caption="Riders"
                columns={columns}
                rows={data.items}
                rowKey={({ id }) => id}
                paging={{ ...data, onPage }}
              />
            )
          }
        </Loaded>
      </Stack>
    </>
  );
}
