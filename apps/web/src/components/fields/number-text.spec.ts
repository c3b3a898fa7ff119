import { describe, expect, it } from 'vitest';
import { keepNumber, readNumber, writeNumber } from './number-text';

describe('readNumber', () => {
  it('takes a point or a comma, and spaces between thousands', () => {
    expect(['12.5', '12,5', ' 1 200 ', '.5', '-0.05'].map(readNumber)).toEqual([
      12.5, 12.5, 1200, 0.5, -0.05,
    ]);
  });

  it('takes nothing else for a number', () => {
    for (const text of ['', 'twelve', '1.2.3', '1,200.5', '1e3', '0x10', '-'])
      expect(readNumber(text)).toBeUndefined();
  });
});

describe('keepNumber', () => {
  it('keeps what was typed in the unit of the contract', () => {
    expect(keepNumber('42,5', 1000, true)).toBe(42_500);
    expect(keepNumber('26.2', 1609.344, true)).toBe(42_165);
    expect(keepNumber('  ', 1000, true)).toBeNull();
    expect(keepNumber('far', 1000, true)).toBeNaN();
  });
});

it('writes without idle zeros', () => {
  expect([writeNumber(42.5, 1), writeNumber(42, 1), writeNumber(26.219, 1)]).toEqual(['42.5', '42', '26.2']);
});
