import { Box } from '@chakra-ui/react';
import { reminderStates } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { DataTable } from '../../components/data-table';
import { EmptyState } from '../../components/empty-state';
import { Tiles } from '../../components/fields/tiles';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { usePageNumber, useUrlState } from '../../components/use-url-state';
import { remindersQuery } from './api/reminders';
import { reminderColumns } from './reminder-columns';
import { stateWords } from './reminder-words';

const choices = [
  { value: '', label: 'All' },
  ...reminderStates.map((value) => ({ value, label: value === 'waiting' ? 'Waiting' : stateWords[value] })),
];

/** What was written to riders, what waits, is held or failed, and why. */
export function Reminders() {
  const [chosen, choose] = useUrlState('state');
  const state = reminderStates.find((one) => one === chosen);
  const [page, onPage] = usePageNumber();
  const query = useQuery({ ...remindersQuery({ state, page, size: 25 }), refetchInterval: 20_000 });
  return (
    <>
      <PageHeader
        title="Reminders"
        lead="Letters to riders, newest first. A treatment closes the letter about it."
      />
      <Box mb="6" maxWidth="46rem">
        <Tiles name="state" label="Show" options={choices} value={state ?? ''} onChange={choose} />
      </Box>
      <Loaded query={query} rows={8} height="4rem">
        {(data) =>
          data.total === 0 ? (
            <EmptyState title={state ? `None is ${state}` : 'No letters yet'}>
              Each night a letter is written to every rider whose chain is likely to fall due. You can also
              write one from the page Due.
            </EmptyState>
          ) : (
            <DataTable
              caption="Reminders"
              columns={reminderColumns}
              rows={data.items}
              rowKey={({ id }) => id}
              paging={{ ...data, onPage }}
            />
          )
        }
      </Loaded>
    </>
  );
}
