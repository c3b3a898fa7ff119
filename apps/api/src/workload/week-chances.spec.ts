import { chainsOfWeek, mondayOf, shiftWeeks } from './week-chances';

const sum = (chances: number[]) => chances.reduce((total, p) => total + p, 0);

describe('mondayOf', () => {
  it.each([
    ['2026-11-30', '2026-11-30'],
    ['2026-12-01', '2026-11-30'],
    ['2026-12-06', '2026-11-30'],
    ['2026-12-07', '2026-12-07'],
  ])('%s is in the week of %s', (day, monday) => {
    const count = (iso: string) => Date.parse(iso) / 86_400_000;
    expect(mondayOf(count(day))).toBe(count(monday));
  });
});

describe('shiftWeeks', () => {
  const weekly = [0.1, 0.2, 0.3, 0.4];
  const kept = { now: 0, weekly };

  it('leaves the chances of an estimate made on that Monday as they are', () => {
    shiftWeeks(kept, 100, 100, 3).forEach((p, w) => expect(p).toBeCloseTo(weekly[w]!, 12));
  });

  it('counts what fell due before as due in the first week, and loses nothing', () => {
    const shifted = shiftWeeks(kept, 100, 107, 3);
    expect(shifted[0]).toBeCloseTo(0.3, 12);
    expect(sum(shifted)).toBeCloseTo(1, 12);
  });

  it('leaves what is due already in the first week, however late in it', () => {
    const shifted = shiftWeeks({ now: 0.9, weekly: [0.97, 0.03] }, 106, 100, 3);
    expect(shifted[0]).toBeCloseTo(0.91, 12);
    expect(sum(shifted)).toBeCloseTo(1, 12);
  });

  it('spreads a week that straddles a Monday over both', () => {
    const shifted = shiftWeeks(kept, 103, 100, 5);
    expect(shifted[0]).toBeCloseTo((4 / 7) * 0.1, 12);
    expect(shifted[1]).toBeCloseTo((3 / 7) * 0.1 + (4 / 7) * 0.2, 12);
    expect(sum(shifted)).toBeCloseTo(1, 12);
  });
});

describe('chainsOfWeek', () => {
  it('names the likeliest first and leaves out the unlikely', () => {
    const chain = (chainId: string, chance: number) => ({
      chainId,
      label: 'A',
      riderName: 'R',
      dipped: true,
      lubrication: [chance],
      replacement: [0],
    });
    expect(
      chainsOfWeek([chain('a', 0.2), chain('b', 0.9), chain('c', 0.01)], 0).map((c) => c.chainId),
    ).toEqual(['b', 'a']);
  });
});
