import { horizons, treatmentKinds } from '@halfpitch/contracts';
import type { Accuracy } from '@halfpitch/contracts';
import { dayOf, scoreWindows, windowOutcome } from '@halfpitch/estimation';
import type { ToldRow } from './told-rows';

const MOST_SHOWN = 20;
const dayOrNull = (day: string | null) => (day === null ? null : dayOf(day));

function outcomeOf({ p10, p50, p90, day, seen }: ToldRow) {
  const window = { p10: dayOrNull(p10), p50: dayOrNull(p50), p90: dayOrNull(p90) };
  return windowOutcome(window, dayOf(day), seen);
}

/** What was said against what happened, by how long before and by what was judged. */
export function judge(rows: readonly ToldRow[]): Accuracy {
  const judged = rows.map((row) => ({ row, outcome: outcomeOf(row) }));
  const score = (of: (row: ToldRow) => boolean) =>
    scoreWindows(judged.flatMap(({ row, outcome }) => (of(row) ? [outcome] : [])));
  const fortnight = judged.filter(({ row }) => row.horizon === 'two-weeks');
  return {
    horizons: horizons.map((horizon) => ({
      horizon,
      score: score((row) => row.horizon === horizon && row.kind !== 'replacement'),
    })),
    kinds: [...treatmentKinds, 'replacement' as const]
      .map((kind) => ({ kind, score: score((row) => row.horizon === 'two-weeks' && row.kind === kind) }))
      .filter(({ score: { cases } }) => cases > 0),
    latest: fortnight.slice(0, MOST_SHOWN).map(({ row: { horizon, ...row }, outcome: { verdict } }) => ({
      ...row,
      verdict,
    })),
  };
}
