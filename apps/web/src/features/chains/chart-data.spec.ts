import type { Reading } from '@halfpitch/contracts';
import { describe, expect, it } from 'vitest';
import { cyclePoints, elongationPoints, intervals, monthMarks, splitCycles, timeOf } from './chart-data';

const reading = (over: Partial<Reading>): Reading => ({
  id: 'r',
  chainId: 'c',
  day: '2026-03-01',
  method: 'three-point',
  values: null,
  lower: null,
  upper: null,
  baseline: false,
  notes: '',
  by: '',
  ...over,
});

describe('elongationPoints', () => {
  it('puts the worst place of each reading among the predicted days, in order', () => {
    const curve = [{ day: '2026-02-01', wearKm: 0, p10: -0.02, p50: 0.1, p90: 0.2 }];
    const points = elongationPoints(curve, [reading({ values: [0.2, 0.31, 0.25] }), reading({ upper: 0.5 })]);
    expect(points).toEqual([
      { time: timeOf('2026-02-01'), band: [0, 0.2], middle: 0.1 },
      { time: timeOf('2026-03-01'), measured: 0.31 },
    ]);
  });
});

describe('monthMarks', () => {
  it('marks firsts of months evenly, never more than there is room for', () => {
    const marks = monthMarks(timeOf('2024-12-15'), timeOf('2028-12-01'));
    expect(marks.map((time) => new Date(time).toISOString().slice(0, 10))).toEqual([
      '2025-01-01',
      '2025-11-01',
      '2026-09-01',
      '2027-07-01',
      '2028-05-01',
    ]);
    expect(monthMarks(timeOf('2026-03-02'), timeOf('2026-03-30'))).toEqual([]);
  });
});

describe('intervals', () => {
  it('shows a go/no-go answer as what it is', () => {
    const go = [
      reading({ lower: 0.5, upper: 0.75 }),
      reading({ id: 's', lower: 1 }),
      reading({ values: [0.2] }),
    ];
    expect(intervals(go, 1.5).map(({ from, to }) => [from, to])).toEqual([
      [0.5, 0.75],
      [1, 1.5],
    ]);
  });
});

describe('cycles', () => {
  const cycle = (from: string, ...points: [string, number][]) => ({
    treatmentId: null,
    kind: null,
    from,
    to: null,
    points: points.map(([day, km]) => ({ day, km, lubeKm: km * 2 })),
  });

  it('counts days from the treatment and begins at nothing', () => {
    expect(cyclePoints(cycle('2026-03-01', ['2026-03-04', 40]))).toEqual([
      { days: 0, ridden: 0, counted: 0 },
      { days: 3, ridden: 40_000, counted: 80_000 },
    ]);
  });

  it('leaves out earlier ones in which nothing was ridden', () => {
    const cycles = [cycle('2026-01-01', ['2026-01-02', 9]), cycle('2026-02-01'), cycle('2026-03-01')];
    const { now, before } = splitCycles({ cycles }, 3);
    expect(now?.from).toBe('2026-03-01');
    expect(before.map(({ from }) => from)).toEqual(['2026-01-01']);
  });
});
