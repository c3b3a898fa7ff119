import { describe, expect, it } from 'vitest';
import { inspectCsv } from '@halfpitch/ride-files';
import { matchingWords } from './csv-words';

describe('matchingWords', () => {
  it('says how a table is read', () => {
    const table = new TextEncoder().encode('Tag;km\n31.05.2026;12,5\n');
    expect(matchingWords(inspectCsv(table).matching)).toBe(
      'Semicolon between columns, decimals as 12,5, dates day first, kilometres.',
    );
  });

  it('leaves out what is still asked', () => {
    const table = new TextEncoder().encode('Tag;weit\n03.04.2025;12,5\n');
    const { matching, questions } = inspectCsv(table);
    expect(matchingWords(matching, questions)).toBe('Semicolon between columns.');
  });
});
