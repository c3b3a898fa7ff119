import type { Reminder } from '@halfpitch/contracts';
import type { EstimateDetail } from '../estimates/estimate.entity';
import type { Subject } from './subjects';

/** Why no reminder can be written about this chain, or null where one can. */
export function whyNotTo(
  kind: Reminder['kind'],
  { retired, remindersOn, riderName }: Pick<Subject, 'retired' | 'remindersOn' | 'riderName'>,
  detail: Pick<EstimateDetail, 'lubrication' | 'replacement'> | undefined,
): string | null {
  if (retired) return 'This chain is retired.';
  if (!remindersOn) return `${riderName} has stopped the letters; telephone instead.`;
  if (detail && !detail[kind]) return 'This chain is in the box: its treatment does not run out there.';
  return null;
}

/** Why a reminder that is there already is not sent once more, or null where it is. */
export function whyNotAgain(state: Reminder['state'], again: boolean): string | null {
  if (state === 'held' || state === 'closed') return null;
  if (state === 'waiting') return 'It is on its way already.';
  if (again) return null;
  return state === 'sent'
    ? 'It was sent in this cycle already. Ask for it again if the rider should get a second letter.'
    : 'It may have arrived, though sending ended with an error. Ask for it again to send a second letter.';
}
