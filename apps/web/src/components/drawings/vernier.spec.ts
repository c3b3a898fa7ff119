import { describe, expect, it } from 'vitest';
import { along, LEFT, mainLines, meeting, RIGHT, scaleEnd, slideLines } from './vernier';

describe('the vernier', () => {
  // A vernier of ten divisions over nine reads tenths of a division (metrology; memory).
  it.each([0, 0.01, 0.38, 0.5, 0.75, 0.99, 1.04])(
    'meets the main scale at the hundredths of %s %',
    (value) => {
      const tenths = slideLines(value)[meeting(value)]! * 10;
      expect(Math.abs(tenths - Math.round(tenths))).toBeLessThan(1e-9);
      const others = slideLines(value).filter((_, i) => i % 10 !== meeting(value));
      for (const line of others) expect(Math.abs(line * 10 - Math.round(line * 10))).toBeGreaterThan(0.05);
    },
  );

  it('is long enough for its slide', () => {
    for (const value of [0, 0.5, 1.1, 1.7, 2.4])
      expect(scaleEnd(value)).toBeGreaterThanOrEqual(slideLines(value)[10]! - 1e-9);
    expect(scaleEnd(0.38)).toBe(2);
  });

  it('spans the drawing, and does not shrink below a new chain', () => {
    expect(along(0, 2)).toBe(LEFT);
    expect(along(2, 2)).toBe(RIGHT);
    expect(slideLines(-0.1)[0]).toBe(0);
    expect(mainLines(2)).toHaveLength(21);
  });
});
