import { describe, expect, it } from 'vitest';
import { importWords } from './import-words';

describe('importWords', () => {
  it('tells what was added, what was there and what was not taken', () => {
    expect(importWords({ added: 1940, alreadyThere: 1, refused: 2 })).toBe(
      '1,940 rides added, 1 ride already there, 2 not taken.',
    );
  });
  it('says so when nothing came of it', () => {
    expect(importWords({ added: 0, alreadyThere: 0, refused: 0 })).toBe('Nothing was added.');
  });
});
