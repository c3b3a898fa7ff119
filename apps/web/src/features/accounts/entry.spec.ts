import { describe, expect, it } from 'vitest';
import { safeReturn } from './entry';

describe('safeReturn', () => {
  it('goes back to a page of this site', () => {
    expect(safeReturn('/chains/1?tab=2')).toBe('/chains/1?tab=2');
    expect(safeReturn(null)).toBe('/');
  });

  it('never leads to another site', () => {
    for (const to of [
      '//elsewhere.example',
      '/\\elsewhere.example',
      'https://elsewhere.example',
      'javascript:alert(1)',
      '',
    ])
      expect(safeReturn(to)).toBe('/');
  });
});
