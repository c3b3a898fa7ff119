import { describe, expect, it } from 'vitest';
import { narrowWords } from './estimate-words';

describe('narrowWords', () => {
  it('says what another reading would bring', () => {
    expect(narrowWords({ method: 'three-point', factor: 0.5 })).toBe(
      'A reading with a three-point gauge would about halve it.',
    );
    expect(narrowWords({ method: 'three-point', factor: 0.72 })).toBe(
      'A reading with a three-point gauge would make it about 28 % shorter.',
    );
  });
  it('is silent when nothing would help', () => expect(narrowWords(null)).toBeNull());
});
