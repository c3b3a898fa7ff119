import { describe, expect, it } from 'vitest';
import { nextLabel } from './next-label';

describe('nextLabel', () => {
  it('counts on by letters and steps over what is taken', () => {
    expect(nextLabel([])).toBe('Chain A');
    expect(nextLabel([{ label: 'Silver' }])).toBe('Chain B');
    expect(nextLabel([{ label: 'chain b' }])).toBe('Chain C');
    expect(nextLabel(Array.from({ length: 26 }, () => ({ label: 'x' })))).toBe('Chain 27');
  });
});
