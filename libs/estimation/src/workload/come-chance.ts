/** What became of a reminder: whole days until the visit, or until now where nobody has come. */
export interface Answer {
  days: number;
  came: boolean;
}

/** Weakly held before anything is seen: two riders came in the first week and two did not (judgement). */
const PRIOR = { came: 2, stayed: 2 };
/** Who has not come after so many weeks is no longer answering that reminder. */
const WEEKS = 12;

/**
 * The chance that a rider whose chain is due comes within a week, learned from past reminders: each week of waiting is
 * a trial, the visit ends them (a geometric waiting time with a beta prior; the posterior mean).
 */
export function comeChance(answers: readonly Answer[]): number {
  let { came, stayed } = PRIOR;
  for (const answer of answers) {
    const weeks = Math.floor(Math.max(answer.days, 0) / 7);
    stayed += Math.min(weeks, WEEKS);
    if (answer.came && weeks < WEEKS) came++;
  }
  return came / (came + stayed);
}
