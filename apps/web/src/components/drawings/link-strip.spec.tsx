import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { renderOnPage } from '../../test-page';
import { drynessOf } from './dryness';
import { filledTo, PITCH, ROLLER, ROLLERS, rollerX } from './link-shape';
import { LinkStrip } from './link-strip';

describe('the link strip', () => {
  it('says the state in words', () => {
    renderOnPage(<LinkStrip share={0.724} label="Chain A" />);
    expect(screen.getByRole('img', { name: 'Chain A: Turning, 72 % of the treatment used' })).toBeDefined();
    expect(screen.getByText('Turning')).toBeDefined();
  });

  it('is silent as an ornament', () => {
    renderOnPage(<LinkStrip share={0.5} decorative />);
    expect(screen.queryByRole('img')).toBeNull();
  });

  it('turns at 0.6 and is dry beyond 1', () => {
    expect([0, 0.599, 0.6, 1, 1.001, 3].map(drynessOf)).toEqual([
      'fresh',
      'fresh',
      'turning',
      'turning',
      'dry',
      'dry',
    ]);
  });

  it('fills a roller for each tenth and never leaves the strip', () => {
    expect(filledTo(0)).toBe(rollerX(0) - ROLLER);
    expect(filledTo(0.25)).toBeCloseTo(rollerX(2), 9);
    expect(filledTo(1)).toBeCloseTo(rollerX(10) - ROLLER, 9);
    expect(filledTo(1.3)).toBeCloseTo(rollerX(ROLLERS - 1) + ROLLER, 9);
    expect(filledTo(9)).toBe(filledTo(1.3));
    expect(filledTo(-1)).toBe(filledTo(0));
    expect(filledTo(1.3)).toBeLessThan(ROLLERS * PITCH);
  });
});
