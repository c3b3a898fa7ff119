import type { Accuracy, Horizon, WindowScore } from '@halfpitch/contracts';
import { percent } from '../../app/format';
import { treatmentWords } from '../../components/trade-words';

/** What an 80 % window promises. */
const PROMISED = 0.8;
/** Below so many due days known, a share says next to nothing. */
const ENOUGH = 10;

export const horizonWords: Record<Horizon, string> = {
  'at-treatment': 'Right after the treatment',
  'two-weeks': 'Two weeks before the visit',
  'one-week': 'One week before the visit',
};

export const partWords = ['Before it', 'In its first half', 'In its second half', 'After it'] as const;

export const verdictWords: Record<Accuracy['latest'][number]['verdict'], string> = {
  held: 'Held',
  sooner: 'Due sooner',
  later: 'Lasted longer',
  open: 'Can’t tell',
};

/** What was found at the bench, as it bears on the window. */
export const seenWords: Record<Accuracy['latest'][number]['seen'], string> = {
  before: 'Past it',
  then: 'Just due',
  after: 'Not due yet',
};

export const judgedWords = (kind: Accuracy['kinds'][number]['kind']): string =>
  kind === 'replacement' ? 'Chain, until worn' : treatmentWords[kind];

/** The share that held, as '71 % (59–82 %)'; a dash where no due day is known. */
export const heldWords = ({ known }: WindowScore): string =>
  known ? `${percent(known.share)} (${percent(known.low).replace(' %', '')}–${percent(known.high)})` : '–';

/** The whole in one or two sentences. */
export function verdict({ known, medianMissDays }: WindowScore): string {
  if (!known) return 'No chain came in just as its treatment ran out, so no due day is known yet.';
  const count = `Of ${known.n} due days that are known, ${Math.round(known.share * known.n)} lay inside the window told two weeks before: ${percent(known.share)}, where 80 % are promised.`;
  if (known.n < ENOUGH) return `${count} That is too few to judge by.`;
  const chance = `With so many, chance alone puts it between ${percent(known.low)} and ${percent(known.high)}`;
  const judged =
    known.high < PROMISED
      ? `${chance}: the windows are too narrow.`
      : known.low > PROMISED
        ? `${chance}: the windows are wider than they need to be.`
        : `${chance}: the promise may well be kept.`;
  if (medianMissDays === null || Math.round(medianMissDays) === 0) return `${count} ${judged}`;
  const days = Math.abs(Math.round(medianMissDays));
  const way = medianMissDays > 0 ? 'later' : 'sooner';
  return `${count} ${judged} Half of them fell due ${days} ${days === 1 ? 'day' : 'days'} or more ${way} than the window’s middle.`;
}
