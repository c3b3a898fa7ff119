import { describe, expect, it } from 'vitest';
import { contrast, lightness } from './contrast';
import { dark, light } from './palette';

describe('contrast', () => {
  // WCAG 2.2: black on white is 21:1; #777777 on white is the well-known 4.48:1 that just fails (computed).
  it('follows the WCAG formula', () => {
    expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 6);
    expect(contrast('#777777', '#FFFFFF')).toBeCloseTo(4.478, 3);
    expect(contrast('#FFFFFF', '#777777')).toBe(contrast('#777777', '#FFFFFF'));
  });

  // CIE 1976: L* of the middle grey #777777 is 50.0 (computed).
  it('knows lightness', () => {
    expect(lightness('#FFFFFF')).toBeCloseTo(100, 6);
    expect(lightness('#777777')).toBeCloseTo(50, 0);
  });
});

describe.each([
  ['light', light],
  ['dark', dark],
])('the %s palette', (_, { ground, ink, line, steel, dryness }) => {
  const grounds = [ground.page, ground.panel, ground.muted];

  it.each(
    Object.entries({
      plain: ink.plain,
      muted: ink.muted,
      quiet: ink.quiet,
      error: ink.error,
      steel: steel.text,
    }),
  )('keeps %s writing at 4.5:1 or more (WCAG 2.2, 1.4.3)', (_name, colour) => {
    for (const on of [...grounds, steel.wash]) expect(contrast(colour, on)).toBeGreaterThanOrEqual(4.5);
  });

  it('keeps plain writing at 7:1 on every ground (WCAG 2.2, 1.4.6)', () => {
    for (const on of Object.values({ ...ground, inverted: ground.page }))
      expect(contrast(ink.plain, on)).toBeGreaterThanOrEqual(7);
    expect(contrast(ink.inverted, ground.inverted)).toBeGreaterThanOrEqual(7);
    expect(contrast(steel.onSolid, steel.solid)).toBeGreaterThanOrEqual(7);
  });

  it('lets controls, rings and drawings be seen at 3:1 (WCAG 2.2, 1.4.11)', () => {
    for (const on of grounds) {
      expect(contrast(line.control, on)).toBeGreaterThanOrEqual(3);
      expect(contrast(steel.solid, on)).toBeGreaterThanOrEqual(3);
    }
  });

  it('keeps the steps of the dryness ramp apart by lightness alone', () => {
    const steps = Object.values(dryness).map(lightness);
    const gaps = [
      [0, 1],
      [1, 2],
      [0, 2],
    ].map(([a, b]) => Math.abs(steps[a!]! - steps[b!]!));
    expect(Math.min(...gaps)).toBeGreaterThanOrEqual(17);
  });
});
