import type { ChainEstimate, Reading, Usage } from '@halfpitch/contracts';
import { daysBetween } from '../../app/format';

/** A day as a number for an axis, ms. */
export const timeOf = (day: string): number => Date.parse(`${day}T00:00:00Z`);

export interface ElongationPoint {
  time: number;
  /** Between which it lies with a chance of 80 %, %. */
  band?: [number, number];
  middle?: number;
  /** The worst place of a reading, %. */
  measured?: number;
}

/** What was measured and what is predicted on one time line. */
export function elongationPoints(
  curve: ChainEstimate['elongation']['curve'],
  readings: readonly Reading[],
): ElongationPoint[] {
  const predicted = curve.map(({ day, p10, p50, p90 }): ElongationPoint => ({
    time: timeOf(day),
    band: [Math.max(0, p10), Math.max(0, p90)],
    middle: Math.max(0, p50),
  }));
  const measured = readings.flatMap(({ day, values }): ElongationPoint[] =>
    values ? [{ time: timeOf(day), measured: Math.max(...values) }] : [],
  );
  return [...predicted, ...measured].sort((a, b) => a.time - b.time);
}

const MONTHS_MARKED = 5;

/** Firsts of months to mark on a time line, about as many as there is room for. */
export function monthMarks(from: number, to: number): number[] {
  const [first, last] = [new Date(from), new Date(to)];
  const months =
    (last.getUTCFullYear() - first.getUTCFullYear()) * 12 + last.getUTCMonth() - first.getUTCMonth();
  const every = Math.max(1, Math.ceil(months / MONTHS_MARKED));
  const marks: number[] = [];
  for (let i = 1; i <= months; i += every)
    marks.push(Date.UTC(first.getUTCFullYear(), first.getUTCMonth() + i, 1));
  return marks;
}

/** A go/no-go reading is an interval: from what goes in to what does not, %. */
export function intervals(readings: readonly Reading[], top: number) {
  return readings
    .filter(({ lower, upper }) => lower !== null || upper !== null)
    .map(({ id, day, lower, upper }) => ({ id, time: timeOf(day), from: lower ?? 0, to: upper ?? top }));
}

export type Cycle = Usage['cycles'][number];

/** A cycle's running distance by days since its treatment, metres; it begins at nothing. */
export function cyclePoints({ from, points }: Cycle) {
  const later = points.map(({ day, km, lubeKm }) => ({
    days: daysBetween(from, day),
    ridden: km * 1000,
    counted: lubeKm * 1000,
  }));
  return [{ days: 0, ridden: 0, counted: 0 }, ...later];
}

/** The cycle that runs, and the last ones before it in which the chain was ridden, newest first. */
export function splitCycles({ cycles }: Usage, earlier: number): { now: Cycle | undefined; before: Cycle[] } {
  const before = cycles.slice(0, -1).filter(({ points }) => points.length > 0);
  return { now: cycles.at(-1), before: before.slice(-earlier).reverse() };
}
