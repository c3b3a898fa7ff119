import { describe, expect, it } from 'vitest';
import { importWords, sumOf } from './import-words';

describe('importWords', () => {
  it('tells what was added, what was there, what is another sport and what was not taken', () => {
    expect(importWords({ added: 1940, alreadyThere: 1, refused: 2, otherSport: 0 })).toBe(
      '1,940 rides added, 1 ride already there, 2 not taken.',
    );
    const files = [
      { added: 1, alreadyThere: 0, refused: 3, otherSport: 1 },
      { added: 2, alreadyThere: 0, refused: 1, otherSport: 1 },
    ];
    expect(importWords(sumOf(files))).toBe('3 rides added, 2 of another sport, 2 not taken.');
  });
  it('says so when nothing came of it', () => {
    expect(importWords(sumOf([]))).toBe('Nothing was added.');
  });
});
