import type { PlanOutlook } from '@halfpitch/contracts';
import { chance, dayWords } from '../../app/format';

/** Whether the chain lasts through the plan, in a sentence or two. */
export function outlookWords({ lubrication, replacement, treatments, chainLabel }: PlanOutlook): string {
  const sentences = [
    `${chainLabel} is due for its treatment by the end of it with a chance of ${chance(lubrication.byEnd)}, before it begins with ${chance(lubrication.before)}.`,
  ];
  if (replacement.byEnd >= 0.05)
    sentences.push(`It is due for replacement by then with a chance of ${chance(replacement.byEnd)}.`);
  if (treatments >= 1)
    sentences.push(
      `Even a fresh treatment is used up ${treatments < 1.75 ? 'once' : `about ${Math.round(treatments)} times`} on the way, more in the wet: plan to redo it.`,
    );
  return sentences.join(' ');
}

/** What to do about it. */
export function adviceWords({ comeInBy }: Pick<PlanOutlook, 'comeInBy'>, today: string): string {
  if (comeInBy === null) return 'The chain should last through it.';
  return comeInBy <= today ? 'Come in today.' : `Come in by ${dayWords(comeInBy, today)}.`;
}
