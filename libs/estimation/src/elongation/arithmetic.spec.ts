import { ImpossibleInputError } from '../errors';
import { elongationFromInches, elongationPct } from './arithmetic';
import { defaultWearLimitPct } from './limits';

describe('elongation arithmetic', () => {
  it('turns the rule’s sixteenths over 12 in into % (exact fractions; computed)', () => {
    expect(elongationFromInches(1 / 32)).toBeCloseTo(0.2604, 4);
    expect(elongationFromInches(1 / 16)).toBeCloseTo(0.5208, 4);
    expect(elongationFromInches(3 / 32)).toBeCloseTo(0.78125, 10);
    expect(elongationFromInches(1 / 8)).toBeCloseTo(1.0417, 4);
  });

  it('does so over other lengths (computed)', () => {
    expect(elongationFromInches(1 / 8, 22)).toBeCloseTo(1.136, 3);
    expect(elongationPct(50.375 * 25.4, 100)).toBeCloseTo(0.75, 10);
    expect(elongationPct(256, 20)).toBeCloseTo(0.787, 3);
  });

  it('reads 0.075 and 0.1 mm a link as 0.591 and 0.787 % (Rohloff Caliber 2: rohloff.de read; % computed)', () => {
    expect(elongationPct(12.7 + 0.075, 1)).toBeCloseTo(0.591, 3);
    expect(elongationPct(12.7 + 0.1, 1)).toBeCloseTo(0.787, 3);
  });

  it('takes one caliper reading from another: 5.2 in less 1.18 in over 8 pitches (one person’s data, read)', () => {
    expect(elongationPct(4.02 * 25.4, 8)).toBeCloseTo(0.5, 10);
  });

  it('calls 24 pitches of 12.7 mm, a foot, unworn (ISO 9633, memory)', () => {
    expect(elongationPct(304.8, 24)).toBeCloseTo(0, 10);
  });

  it.each([
    ['no pitches', () => elongationPct(304.8, 0)],
    ['a length that is no number', () => elongationPct(NaN, 24)],
    ['a chain 40 % too long', () => elongationPct(426.7, 24)],
    ['a fraction without end', () => elongationFromInches(Infinity)],
  ])('refuses %s', (_, measure) => expect(measure).toThrow(ImpossibleInputError));
});

describe('default wear limits (common practice; shop pages read for the first two)', () => {
  it.each([
    [1, 1],
    [6, 0.75],
    [10, 0.75],
    [11, 0.5],
    [13, 0.5],
  ])('%i speeds: %d %%', (speeds, limit) => expect(defaultWearLimitPct(speeds)).toBe(limit));
});
