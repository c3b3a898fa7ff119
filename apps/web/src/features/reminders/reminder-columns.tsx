import { Box, Link, Text } from '@chakra-ui/react';
import type { Reminder } from '@halfpitch/contracts';
import { Link as RouterLink } from 'react-router-dom';
import { windowWords } from '../../app/format';
import { useFormat } from '../../app/use-format';
import type { Column } from '../../components/data-table';
import { ReminderActs } from './reminder-acts';
import { aboutWords, stateWords } from './reminder-words';

function StateCell({ reminder }: { reminder: Reminder }) {
  const format = useFormat();
  const { state, sentAt, createdAt, attempts, lastError } = reminder;
  return (
    <Box maxWidth={{ md: '18rem' }}>
      <Text fontWeight="semibold" color={state === 'failed' ? 'fg.error' : undefined}>
        {stateWords[state]}
      </Text>
      <Text color="fg.muted" textStyle="sm">
        {sentAt ? `Sent ${format.instant(sentAt)}` : `Written ${format.instant(createdAt)}`}
        {attempts > 1 && `, ${attempts} tries`}
      </Text>
      {lastError && state !== 'sent' && state !== 'closed' && (
        <Text textStyle="sm" overflowWrap="anywhere">
          {lastError}
        </Text>
      )}
    </Box>
  );
}

/** The window as the letter states it, seen from the day it was written. */
function WindowCell({ reminder }: { reminder: Reminder }) {
  const written = reminder.createdAt.slice(0, 10);
  return <Text maxWidth={{ md: '16rem' }}>{windowWords(reminder.window, written)}</Text>;
}

export const reminderColumns: Column<Reminder>[] = [
  {
    head: 'Rider',
    rowHead: true,
    cell: (reminder) => (
      <>
        <Link asChild>
          <RouterLink to={`/riders/${reminder.riderId}`}>{reminder.riderName}</RouterLink>
        </Link>
        <Text color="fg.muted" fontWeight="normal" textStyle="sm" overflowWrap="anywhere">
          {reminder.email}
        </Text>
      </>
    ),
  },
  {
    head: 'About',
    cell: (reminder) => (
      <Box>
        {aboutWords[reminder.kind]}
        <Text color="fg.muted" textStyle="sm">
          {reminder.chainLabel}, {reminder.bikeName ?? 'in the box'}
        </Text>
      </Box>
    ),
  },
  { head: 'Window', cell: (reminder) => <WindowCell reminder={reminder} /> },
  { head: 'State', cell: (reminder) => <StateCell reminder={reminder} /> },
  {
    head: 'Do',
    cell: (reminder) =>
      reminder.state === 'closed' ? (
        <Text color="fg.muted">Nothing to do</Text>
      ) : (
        <ReminderActs subject={reminder} reminder={reminder} />
      ),
  },
];
