import type { EstimateDetail } from '../estimates/estimate.entity';
import type { Reason, Reminder } from '@halfpitch/contracts';

const many = (count: number, one: string, more: string) => (count === 1 ? `one ${one}` : `${count} ${more}`);
const howFar = (days: number) => `${many(Math.abs(days), 'day', 'days')} ${days < 0 ? 'earlier' : 'later'}`;

/** One reason as the half of a sentence that comes before "moved it 6 days earlier". */
const SUBJECTS: Partial<Record<Reason['code'], (data: Reason['data']) => string>> = {
  'riding-more': ({ km }) => `riding more than usual (${km} km)`,
  'riding-less': () => 'riding less than usual',
  'wet-rides': ({ rides = 0, km }) =>
    `${many(rides, 'wet ride', 'wet rides')} (${km} km, which count double)`,
  'rough-rides': ({ rides = 0, km }) => `${many(rides, 'rough ride', 'rough rides')} (${km} km)`,
  reading: () => 'a new reading',
  'planned-riding': ({ km }) => `the ${km} km you have planned`,
  'unlogged-distance': ({ km }) => `${km} km that were not logged`,
};

/** Why, in one sentence: what moved the window most, or else how far the treatment or the chain has come. */
export function reasonSentence(kind: Reminder['kind'], detail: EstimateDetail): string {
  for (const { code, about, days, data } of detail.reasons) {
    const subject = SUBJECTS[code];
    if (about !== kind || !subject || Math.round(days) === 0) continue;
    const text = `${subject(data)} moved it ${howFar(Math.round(days))}.`;
    return text.charAt(0).toUpperCase() + text.slice(1);
  }
  if (kind === 'replacement') return `It has lengthened by about ${detail.elongationPct.toFixed(2)} %.`;
  const used = Math.round(detail.treatment.lubeKmUsed);
  return `About ${used} of the ${Math.round(detail.treatment.life.p50)} km that its last treatment usually lasts are used.`;
}
