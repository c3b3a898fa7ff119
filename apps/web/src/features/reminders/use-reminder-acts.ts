import type { Reminder, SendReminder } from '@halfpitch/contracts';
import { useQueryClient } from '@tanstack/react-query';
import { toastDone, toastError } from '../../components/toaster';
import { holdReminder } from './api/hold-reminder';
import { releaseReminder } from './api/release-reminder';
import { sendReminder } from './api/send-reminder';

type Subject = Pick<SendReminder, 'chainId' | 'kind'>;

/** What the desk does about reminders; each act says what it did; a waiting letter that was held can be let go again. */
export function useReminderActs() {
  const client = useQueryClient();
  const refresh = () => client.invalidateQueries({ queryKey: ['reminders'] });
  const release = async (id: string) => {
    const { riderName } = await releaseReminder(id);
    await refresh();
    toastDone(`The reminder to ${riderName} is on its way.`);
  };
  const held = async (kept: Promise<Reminder>, wasOnItsWay: boolean) => {
    const { id, riderName } = await kept;
    await refresh();
    const undo = wasOnItsWay ? () => void release(id).catch(toastError) : undefined;
    toastDone(`The reminder to ${riderName} is held.`, undo);
  };
  return {
    release,
    write: async (subject: Subject, again: boolean) => {
      const { riderName } = await sendReminder({ ...subject, again, hold: false });
      await refresh();
      toastDone(`A reminder to ${riderName} is on its way.`);
    },
    /** Held before it is written: there is no letter that an undo could send. */
    holdAhead: (subject: Subject) => held(sendReminder({ ...subject, again: false, hold: true }), false),
    hold: (id: string) => held(holdReminder(id), true),
  };
}
