import type { Reminder, SendReminder } from '@halfpitch/contracts';
import { useQueryClient } from '@tanstack/react-query';
import { toastDone, toastError } from '../../components/toaster';
import { holdReminder } from './api/hold-reminder';
import { releaseReminder } from './api/release-reminder';
import { sendReminder } from './api/send-reminder';

type Subject = Pick<SendReminder, 'chainId' | 'kind'>;

/** What the desk does about reminders; each act says what it did, and holding can be taken back. */
export function useReminderActs() {
  const client = useQueryClient();
  const refresh = () => client.invalidateQueries({ queryKey: ['reminders'] });
  const release = async (id: string) => {
    const { riderName } = await releaseReminder(id);
    await refresh();
    toastDone(`The reminder to ${riderName} is on its way.`);
  };
  const held = async (kept: Promise<Reminder>) => {
    const { id, riderName } = await kept;
    await refresh();
    toastDone(`The reminder to ${riderName} is held.`, () => void release(id).catch(toastError));
  };
  return {
    release,
    write: async (subject: Subject, again: boolean) => {
      const { riderName } = await sendReminder({ ...subject, again, hold: false });
      await refresh();
      toastDone(`A reminder to ${riderName} is on its way.`);
    },
    /** Held before it is written. */
    holdAhead: (subject: Subject) => held(sendReminder({ ...subject, again: false, hold: true })),
    hold: (id: string) => held(holdReminder(id)),
  };
}
