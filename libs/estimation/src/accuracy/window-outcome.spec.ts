import fc from 'fast-check';
import { windowOutcome } from './window-outcome';

const window = { p10: 100, p50: 110, p90: 130 };

describe('windowOutcome', () => {
  it('judges a day that is known', () => {
    expect(windowOutcome(window, 104, 'then')).toMatchObject({
      parts: [1, 1],
      verdict: 'held',
      missedBy: -6,
    });
    expect(windowOutcome(window, 130, 'then')).toMatchObject({
      parts: [2, 2],
      verdict: 'held',
      missedBy: 20,
    });
    expect(windowOutcome(window, 99, 'then').verdict).toBe('sooner');
    expect(windowOutcome(window, 131, 'then').verdict).toBe('later');
  });

  it('judges by quiet and dry only what they prove', () => {
    expect(windowOutcome(window, 105, 'after')).toMatchObject({
      parts: [1, 3],
      verdict: 'open',
      missedBy: null,
    });
    expect(windowOutcome(window, 131, 'after')).toMatchObject({
      parts: [3, 3],
      verdict: 'later',
      missedBy: null,
    });
    expect(windowOutcome(window, 120, 'before')).toMatchObject({
      parts: [0, 2],
      verdict: 'open',
      missedBy: null,
    });
    expect(windowOutcome(window, 99, 'before')).toMatchObject({
      parts: [0, 0],
      verdict: 'sooner',
      missedBy: null,
    });
  });

  it('takes what lies beyond the horizon for later than any day', () => {
    const far = { p10: 120, p50: null, p90: null };
    expect(windowOutcome(far, 130, 'then')).toMatchObject({ parts: [1, 1], verdict: 'held', missedBy: null });
    expect(windowOutcome({ p10: null, p50: null, p90: null }, 130, 'before').verdict).toBe('sooner');
  });

  it('never takes a later day for an earlier part', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 300 }), fc.nat(50), (day, more) => {
        const [first] = windowOutcome(window, day, 'then').parts;
        expect(windowOutcome(window, day + more, 'then').parts[0]).toBeGreaterThanOrEqual(first);
      }),
    );
  });
});
