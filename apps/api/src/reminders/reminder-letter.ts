import { DueWindow, reasonWords, Regime, spanWords, windowWords } from '@halfpitch/contracts';
import type { EstimateDetail } from '../estimates/estimate.entity';
import { writeLetter } from '../mail/letter';
import type { Letter } from '../mail/mail.service';
import type { Reminder } from './reminder.entity';
import type { Subject } from './subjects';

const LUBRICATION: Record<Regime, string> = {
  'immersion-wax': 'a re-wax',
  'drip-wax': 'a drip-wax top-up',
  'wet-oil': 'cleaning and oil',
  'dry-oil': 'cleaning and oil',
};

/** What replacing or treating late leads to: why it is worth coming. */
const WHY_IN_TIME: Record<Reminder['kind'], string> = {
  lubrication: 'A dry chain wears several times as fast, and wears the sprockets with it.',
  replacement:
    'A chain that is past its limit wears out the cassette and chainrings too; replaced in time, they go on.',
};

export interface ReminderText {
  kind: Reminder['kind'];
  subject: Subject;
  window: DueWindow;
  detail: Pick<EstimateDetail, 'reasons' | 'treatment' | 'elongation'>;
  workshop: { name: string; town: string };
  today: string;
  publicUrl: string;
}

/** Why, in one sentence: what moved the window most, or else how far the treatment or the chain has come. */
function whyWords({ kind, detail }: Pick<ReminderText, 'kind' | 'detail'>): string {
  const moved = detail.reasons.find(({ about, days }) => about === kind && Math.round(days) !== 0);
  if (moved) return reasonWords(moved);
  const { now } = detail.elongation;
  if (kind === 'replacement') return `It has lengthened by about ${now.p50.toFixed(2)} %.`;
  const { lubeKmUsed, life } = detail.treatment;
  return `About ${Math.round(lubeKmUsed)} km have been ridden on a treatment that usually lasts ${Math.round(life.p50)} km, rough and wet km counted for more.`;
}

/** 'likely 11–24 March' for a subject line. */
function short({ p10, p90 }: DueWindow, today: string): string {
  if (p10 === null || p10 <= today) return 'now or soon';
  return p90 === null ? 'soon' : `likely ${spanWords(p10, p90, today)}`;
}

/** The letter to the rider: window, reason, a link to the chain's page, and two ways to stop the letters (RFC 8058). */
export function reminderLetter(text: ReminderText): Letter {
  const { kind, subject, window, workshop, today, publicUrl } = text;
  const chain = subject.bikeName
    ? `chain ${subject.label} of your ${subject.bikeName}`
    : `your chain ${subject.label}`;
  const due = kind === 'lubrication' ? LUBRICATION[subject.regime] : 'replacement';
  return writeLetter({
    to: subject.email,
    subject: `${subject.bikeName ?? subject.label}: the chain is due for ${due}, ${short(window, today)}`,
    greeting: `Hello ${subject.riderName},`,
    paragraphs: [
      `By our estimate ${chain} is due for ${due}: ${windowWords(window, today)}.`,
      whyWords(text),
      WHY_IN_TIME[kind],
    ],
    link: { label: 'See the chain and why', url: `${publicUrl}/chains/${subject.chainId}` },
    closing: `${workshop.name}, ${workshop.town}`,
    footer: { label: 'Stop these letters', url: `${publicUrl}/stop/${subject.stopToken}` },
    headers: {
      'List-Unsubscribe': `<${publicUrl}/api/stop/${subject.stopToken}>`,
      'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click',
    },
  });
}
