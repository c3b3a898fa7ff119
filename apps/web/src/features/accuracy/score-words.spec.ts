import { describe, expect, it } from 'vitest';
import { heldWords, verdict } from './score-words';

const score = (n: number, hits: number, low: number, high: number, medianMissDays: number | null = 0) => ({
  cases: n,
  held: hits,
  sooner: 0,
  later: n - hits,
  open: 0,
  known: n === 0 ? null : { n, share: hits / n, low, high },
  parts: [0.1, 0.4, 0.4, 0.1],
  medianMissDays,
});

describe('verdict', () => {
  it('says whether the promise is kept, as far as the numbers can tell', () => {
    expect(verdict(score(56, 40, 0.585, 0.816, 2))).toBe(
      'Of 56 due days that are known, 40 lay inside the window told two weeks before: 71 %, where 80 % are promised. With so many, chance alone puts it between 59 % and 82 %: the promise may well be kept. Half of them fell due 2 days or more later than the window’s middle.',
    );
    expect(verdict(score(100, 50, 0.4, 0.6))).toContain('too narrow');
    expect(verdict(score(100, 95, 0.89, 0.98))).toContain('wider than they need to be');
    expect(verdict(score(4, 3, 0.3, 0.95))).toContain('too few to judge by');
    expect(verdict(score(0, 0, 0, 1))).toContain('no due day is known yet');
  });
});

it('writes a share with its interval', () => {
  expect(heldWords(score(56, 40, 0.585, 0.816))).toBe('71 % (59–82 %)');
  expect(heldWords(score(0, 0, 0, 1))).toBe('–');
});
