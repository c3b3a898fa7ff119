import type { Workload } from '@halfpitch/contracts';
import { percent, spanWords } from '../../app/format';

export type Week = Workload['weeks'][number];
export type Band = Week['treatments'];

const figures = new Intl.NumberFormat('en-GB', { maximumFractionDigits: 0 });
export const whole = (value: number): string => figures.format(value);

/** An 80 % band as '4–9', or '4' where both ends are the same. */
export const bandWords = ({ p10, p90 }: Pick<Band, 'p10' | 'p90'>): string =>
  whole(p10) === whole(p90) ? whole(p10) : `${whole(p10)}–${whole(p90)}`;

/** 'this week', or its days. */
export const weekWords = ({ from, to }: Pick<Week, 'from' | 'to'>, today: string): string =>
  from <= today && today <= to ? 'This week' : spanWords(from, to, today);

/** How a week's bench minutes stand to those there are: more than even odds of too much, possibly, or no. */
export function fit({ p50, p90 }: Pick<Band, 'p50' | 'p90'>, minutes: number): 'over' | 'tight' | 'fits' {
  if (p50 > minutes) return 'over';
  return p90 > minutes ? 'tight' : 'fits';
}

export const fitWords = { over: 'Too much', tight: 'May be too much', fits: 'Fits' } as const;

/** The weeks in a sentence: which is the heaviest, and in how many the bench does not suffice. */
export function benchSummary(
  { weeks, minutesPerWeek }: Pick<Workload, 'weeks' | 'minutesPerWeek'>,
  today: string,
): string {
  const heaviest = weeks.reduce<Week | undefined>(
    (most, week) => (!most || week.benchMinutes.p50 > most.benchMinutes.p50 ? week : most),
    undefined,
  );
  if (!heaviest || heaviest.benchMinutes.p90 === 0) return 'No work is in sight.';
  const over = weeks.filter(({ benchMinutes }) => fit(benchMinutes, minutesPerWeek) === 'over').length;
  const tight = weeks.filter(({ benchMinutes }) => fit(benchMinutes, minutesPerWeek) === 'tight').length;
  const name = weekWords(heaviest, today);
  const most = `${name === 'This week' ? name : `The week ${name}`} is the heaviest: ${bandWords(heaviest.benchMinutes)} minutes of the ${whole(minutesPerWeek)} there are.`;
  const weeksOf = (n: number) => `${n} ${n === 1 ? 'week' : 'weeks'}`;
  if (over > 0) return `${most} In ${weeksOf(over)} there is most likely more work than time.`;
  if (tight > 0) return `${most} In ${weeksOf(tight)} there may be more work than time.`;
  return `${most} No week is likely to be too full.`;
}

/** When riders who are due come, and what that was learned from. */
export function comingSummary({ chancePerWeek, reminders, cameInThreeWeeks }: Workload['coming']): string {
  const odds = `A rider who is due is counted as coming within a week with a chance of ${percent(chancePerWeek)}`;
  if (reminders === 0) return `${odds}, until reminders have taught better.`;
  return `${odds}: of ${reminders} reminders ${cameInThreeWeeks} were followed by a treatment within three weeks.`;
}

/** Treatments and replacements over all weeks, expected number. */
export function countSummary({ weeks }: Pick<Workload, 'weeks'>): string {
  const sum = (of: (week: Week) => number) => whole(weeks.reduce((total, week) => total + of(week), 0));
  const treatments = sum((week) => week.treatments.mean);
  const replacements = sum((week) => week.replacements.mean);
  return `About ${treatments} treatments and ${replacements} chain replacements in ${weeks.length} weeks. A bar is the band in which the number falls with a chance of 80 %, the mark its middle. What is due already counts from this week on, as riders come.`;
}
