import { Box, Link, Text } from '@chakra-ui/react';
import type { Reminder } from '@halfpitch/contracts';
import { Link as RouterLink } from 'react-router-dom';
import { chance } from '../../app/format';
import { useFormat } from '../../app/use-format';
import type { Column } from '../../components/data-table';
import { StateWord } from '../../components/state-word';
import { dueWords } from '../chains/chain-words';
import { ReminderActs } from '../reminders/reminder-acts';
import { stateWords } from '../reminders/reminder-words';
import type { DueRow } from './due-rows';

type Find = (subject: Pick<Reminder, 'chainId' | 'kind'>) => Reminder | undefined;
const subjectOf = ({ chain, kind }: DueRow) => ({ chainId: chain.id, kind, riderName: chain.riderName });

function WindowCell({ row }: { row: DueRow }) {
  const format = useFormat();
  return (
    <Box maxWidth={{ md: '20rem' }}>
      <Text fontWeight="semibold">{row.kind === 'replacement' ? 'Replace' : dueWords[row.chain.regime]}</Text>
      <Text color="fg.muted">{format.window(row.window)}</Text>
    </Box>
  );
}

function LastCell({ reminder }: { reminder?: Reminder }) {
  const format = useFormat();
  if (!reminder || reminder.state === 'closed')
    return (
      <Text color="fg.muted">
        {reminder?.sentAt ? `None since ${format.instant(reminder.sentAt)}` : 'None yet'}
      </Text>
    );
  return (
    <Box>
      <Text color={reminder.state === 'failed' ? 'fg.error' : undefined}>{stateWords[reminder.state]}</Text>
      <Text color="fg.muted" textStyle="sm">
        {format.instant(reminder.sentAt ?? reminder.createdAt)}
      </Text>
    </Box>
  );
}

export const dueColumns = (find: Find): Column<DueRow>[] => [
  {
    head: 'Rider',
    rowHead: true,
    cell: ({ chain }) => (
      <>
        <Link asChild>
          <RouterLink to={`/riders/${chain.riderId}`}>{chain.riderName}</RouterLink>
        </Link>
        <Text color="fg.muted" fontWeight="normal" textStyle="sm">
          {chain.bikeName ?? 'In the box'}, {chain.label}
        </Text>
      </>
    ),
  },
  { head: 'Treatment', cell: ({ chain }) => chain.state && <StateWord dryness={chain.state.dryness} /> },
  { head: 'Due', cell: (row) => <WindowCell row={row} /> },
  { head: 'Within 14 days', numeric: true, cell: ({ window }) => chance(window.chanceWithin14) },
  {
    head: 'Reminder',
    cell: (row) => (row.chain.remindersOn ? <LastCell reminder={find(subjectOf(row))} /> : 'Letters stopped'),
  },
  {
    head: 'Do',
    cell: (row) =>
      row.chain.remindersOn ? (
        <ReminderActs subject={subjectOf(row)} reminder={find(subjectOf(row))} />
      ) : (
        <Text color="fg.muted">Telephone instead</Text>
      ),
  },
];
