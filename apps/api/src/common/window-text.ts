import type { DueWindow } from '@halfpitch/contracts';
import { format, parseISO } from 'date-fns';

type Days = Pick<DueWindow, 'p10' | 'p50' | 'p90'>;

const dayMonth = (day: string) => format(parseISO(day), 'd MMMM');

function span(from: string, to: string): string {
  if (from === to) return dayMonth(from);
  const sameMonth = from.slice(0, 7) === to.slice(0, 7);
  return `${sameMonth ? format(parseISO(from), 'd') : `${dayMonth(from)} `}–${sameMonth ? '' : ' '}${dayMonth(to)}`;
}

/** A due window in words: "likely 11–24 March, most likely 17 March". */
export function windowText({ p10, p50, p90 }: Days): string {
  if (p50 === null || p10 === null) return 'not within two years';
  if (p90 === null) return `likely from ${dayMonth(p10)} on, most likely ${dayMonth(p50)}`;
  return p10 === p90
    ? `most likely ${dayMonth(p50)}`
    : `likely ${span(p10, p90)}, most likely ${dayMonth(p50)}`;
}
