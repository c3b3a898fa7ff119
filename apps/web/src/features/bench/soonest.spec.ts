import type { ChainState, DueWindow } from '@halfpitch/contracts';
import { describe, expect, it } from 'vitest';
import { dueFor, dueSoon } from './soonest';

const due = (p50: string | null, chanceWithin14: number): DueWindow => ({
  p10: p50,
  p50,
  p90: p50,
  chanceNow: 0,
  chanceWithin7: 0,
  chanceWithin14,
  chanceWithin30: 1,
  decidedBy: 'distance',
});
const state = (lubrication: DueWindow | null, replacement: DueWindow): ChainState => ({
  madeAt: '2026-03-01T00:00:00Z',
  shareUsed: 0.5,
  dryness: 'fresh',
  elongationPct: 0.2,
  chancePast: 0,
  lubrication,
  replacement,
});
const kinds = (list: { kind: string }[]) => list.map(({ kind }) => kind);

describe('what a chain falls due for', () => {
  it('puts the earlier median first', () => {
    expect(kinds(dueFor(state(due('2026-03-09', 0.9), due('2026-08-01', 0))))).toEqual([
      'lubrication',
      'replacement',
    ]);
    expect(kinds(dueFor(state(due('2026-03-09', 0.9), due('2026-03-02', 1))))).toEqual([
      'replacement',
      'lubrication',
    ]);
  });

  it('takes a window beyond two years for later than any', () => {
    expect(kinds(dueFor(state(due(null, 0), due('2027-08-01', 0))))).toEqual(['replacement', 'lubrication']);
    expect(kinds(dueFor(state(due('2027-08-01', 0), due(null, 0))))).toEqual(['lubrication', 'replacement']);
  });

  it('says only the replacement while no treatment is known', () => {
    expect(kinds(dueFor(state(null, due('2026-08-01', 0))))).toEqual(['replacement']);
  });

  it('says the second only when it is likely within 14 days', () => {
    expect(kinds(dueSoon(state(due('2026-03-09', 0.9), due('2026-03-12', 0.6))))).toHaveLength(2);
    expect(kinds(dueSoon(state(due('2026-03-09', 0.9), due('2026-08-01', 0.01))))).toEqual(['lubrication']);
  });
});
