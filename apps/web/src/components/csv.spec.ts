import { describe, expect, it } from 'vitest';
import { toCsv } from './csv';

describe('toCsv', () => {
  // RFC 4180, section 2: fields with commas, quotes or line breaks are quoted, quotes doubled, lines end in CR LF (memory).
  it('quotes as RFC 4180 says', () => {
    expect(
      toCsv([
        ['a', 'say "so"', 'x,y'],
        [1.5, null, 'two\nlines'],
      ]),
    ).toBe('a,"say ""so""","x,y"\r\n1.5,,"two\nlines"\r\n');
  });

  it('keeps a spreadsheet from running text, and leaves numbers alone', () => {
    expect(toCsv([['=1+1', -3, '@x']])).toBe("'=1+1,-3,'@x\r\n");
  });
});
