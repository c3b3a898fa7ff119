import type { DueWindow, Reminder } from '@halfpitch/contracts';
import { windowText } from '../common/window-text';
import type { EstimateDetail } from '../estimates/estimate.entity';
import { writeLetter } from '../mail/letter';
import type { Letter } from '../mail/mail.service';
import { reasonSentence } from './reasons';

export interface ReminderFacts {
  kind: Reminder['kind'];
  window: DueWindow;
  detail: EstimateDetail;
  riderName: string;
  riderEmail: string;
  chainId: string;
  chainLabel: string;
  bikeName: string | null;
  workshopName: string;
  stopToken: string;
  publicUrl: string;
}

const SUBJECT = { lubrication: 'is due for wax or oil', replacement: 'is due to be replaced' };
const ADVICE = {
  lubrication:
    'A dry chain squeals, rusts and wears quickly. If you ride in the wet before you come in, dry the chain afterwards and top it up.',
  replacement: 'A chain ridden past its limit wears the sprockets, which cost more than the chain.',
};

/** The letter that tells a rider when, how sure, and why; one click stops such letters (RFC 8058). */
export function reminderLetter(facts: ReminderFacts): Letter {
  const { kind, window, detail, bikeName, chainLabel, publicUrl, workshopName } = facts;
  const which = `Chain ${chainLabel}${bikeName ? ` on ${bikeName}` : ''}`;
  const stopUrl = `${publicUrl}/stop/${facts.stopToken}`;
  return writeLetter({
    to: facts.riderEmail,
    subject: `${which} ${SUBJECT[kind]}`,
    greeting: `Hello ${facts.riderName},`,
    paragraphs: [
      `${which} ${SUBJECT[kind]}: ${windowText(window)}.`,
      reasonSentence(kind, detail),
      ADVICE[kind],
      `Tell ${workshopName} when it suits you; they expect you in these days.`,
    ],
    link: { label: 'See the chain', url: `${publicUrl}/chains/${facts.chainId}` },
    closing: `${workshopName}\nYou get this letter because ${workshopName} looks after your chain. Stop these letters: ${stopUrl}`,
    headers: {
      'List-Unsubscribe': `<${publicUrl}/api/stop/${facts.stopToken}>`,
      'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click',
    },
  });
}
