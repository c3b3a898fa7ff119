import { Button, Flex } from '@chakra-ui/react';
import type { Reminder } from '@halfpitch/contracts';
import { useState } from 'react';
import { ConfirmDialog } from '../../components/confirm-dialog';
import { toastError } from '../../components/toaster';
import { choicesFor } from './reminder-words';
import { useReminderActs } from './use-reminder-acts';

interface ReminderActsProps {
  subject: Pick<Reminder, 'chainId' | 'kind' | 'riderName'>;
  /** The newest about it; none, or a closed one of an earlier cycle. */
  reminder?: Pick<Reminder, 'id' | 'state'>;
}

/** Buttons for what can be done about a chain's reminder now. */
export function ReminderActs({ subject, reminder }: ReminderActsProps) {
  const acts = useReminderActs();
  const [busy, setBusy] = useState(false);
  const { chainId, kind, riderName } = subject;
  const choices = choicesFor(reminder?.state ?? 'none');
  const open = reminder && reminder.state !== 'closed' ? reminder : undefined;
  const about = { chainId, kind };
  const hold = () => {
    setBusy(true);
    const done = open ? acts.hold(open.id) : acts.holdAhead(about);
    void done.catch(toastError).finally(() => setBusy(false));
  };
  const small = (label: string, name: string) => (
    <Button size="sm" variant="outline" aria-label={name}>
      {label}
    </Button>
  );
  return (
    <Flex gap="2" wrap="wrap" justify={{ base: 'flex-end', md: 'flex-start' }}>
      {choices.includes('write') && (
        <ConfirmDialog
          trigger={small('Write now', `Write now to ${riderName}`)}
          title={`Write to ${riderName} now?`}
          confirm="Write now"
          onConfirm={() => acts.write(about, false)}
        >
          The letter goes out at once, with today’s window and the reasons for it.
        </ConfirmDialog>
      )}
      {choices.includes('again') && (
        <ConfirmDialog
          trigger={small('Write again', `Write again to ${riderName}`)}
          title={`Write to ${riderName} again?`}
          confirm="Write again"
          onConfirm={() => acts.write(about, true)}
        >
          {reminder?.state === 'failed'
            ? 'The last try did not arrive. It is written anew, with today’s window.'
            : 'A letter about this was sent already. Another goes out at once, with today’s window.'}
        </ConfirmDialog>
      )}
      {choices.includes('release') && open && (
        <ConfirmDialog
          trigger={small('Release', `Release the reminder to ${riderName}`)}
          title={`Release the reminder to ${riderName}?`}
          confirm="Release and send"
          onConfirm={() => acts.release(open.id)}
        >
          The letter is written anew from today’s estimate and goes out at once.
        </ConfirmDialog>
      )}
      {choices.includes('hold') && (
        <Button
          size="sm"
          variant="outline"
          loading={busy}
          onClick={hold}
          aria-label={`Hold the reminder to ${riderName}`}
        >
          Hold
        </Button>
      )}
    </Flex>
  );
}
