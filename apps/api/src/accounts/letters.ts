import { writeLetter } from '../mail/letter';
import type { Letter } from '../mail/mail.service';

const NOT_YOU = 'If you did not expect this letter, you need do nothing.';

export function invitationLetter(to: string, name: string, workshop: string, url: string): Letter {
  return writeLetter({
    to,
    subject: `${workshop} invites you to Halfpitch`,
    greeting: `Hello ${name},`,
    paragraphs: [
      `${workshop} keeps your chain’s mileage, its readings and its treatments in Halfpitch, and would like you to see them too: when each chain is due for wax or oil, and when it must be replaced.`,
      'The link below is for you alone. It works once, for seven days.',
    ],
    link: { label: 'Accept the invitation', url },
    closing: NOT_YOU,
  });
}

export function resetLetter(to: string, name: string, url: string): Letter {
  return writeLetter({
    to,
    subject: 'A new password for Halfpitch',
    greeting: `Hello ${name},`,
    paragraphs: ['With the link below you choose a new password. It works once, for one hour.'],
    link: { label: 'Choose a new password', url },
    closing: NOT_YOU,
  });
}
