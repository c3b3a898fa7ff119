import { chainsOfWeek, shiftWeeks } from './week-chances';

describe('shiftWeeks', () => {
  const weekly = [0.1, 0.2, 0.3, 0.4];

  it('leaves chances of an estimate made today as they are', () => {
    expect(shiftWeeks(weekly, 100, 100, 3).map((p) => p.toFixed(6))).toEqual([
      '0.100000',
      '0.200000',
      '0.300000',
    ]);
  });

  it('counts what fell due since as due now, and loses nothing', () => {
    const shifted = shiftWeeks(weekly, 100, 107, 3);
    expect(shifted[0]).toBeCloseTo(0.3);
    expect(shifted.reduce((sum, p) => sum + p, 0)).toBeCloseTo(1);
  });
});

describe('chainsOfWeek', () => {
  it('names the likeliest first and leaves out the unlikely', () => {
    const chain = (chainId: string, chance: number) => ({
      chainId,
      label: 'A',
      riderName: 'R',
      lubrication: [chance],
      replacement: [0],
    });
    expect(
      chainsOfWeek([chain('a', 0.2), chain('b', 0.9), chain('c', 0.01)], 0).map((c) => c.chainId),
    ).toEqual(['b', 'a']);
  });
});
