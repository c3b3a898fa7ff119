import type { Ride } from '@halfpitch/contracts';
import { describe, expect, it } from 'vitest';
import { usualRides, usualSurface } from './usual-rides';

const ride = (over: Partial<Ride>): Ride => ({
  id: crypto.randomUUID(),
  bikeId: 'blue',
  chainId: null,
  day: '2026-11-30',
  distanceM: 18_000,
  movingS: null,
  surface: 'road',
  weather: 'dry',
  notes: '',
  startedAt: null,
  source: 'typed',
  ...over,
});

describe('usualRides', () => {
  it('offers what comes again, most frequent first, as it was last ridden', () => {
    const newestFirst = [
      ride({ distanceM: 18_300, weather: 'wet' }),
      ride({ distanceM: 60_000 }),
      ride({ distanceM: 42_000 }),
      ride({ distanceM: 17_900 }),
      ride({ distanceM: 41_500 }),
      ride({ distanceM: 18_100 }),
    ];
    expect(usualRides(newestFirst)).toEqual([
      { bikeId: 'blue', distanceM: 18_300, surface: 'road', weather: 'wet' },
      { bikeId: 'blue', distanceM: 42_000, surface: 'road', weather: 'dry' },
    ]);
  });

  it('keeps bikes and grounds apart', () => {
    expect(usualRides([ride({}), ride({ bikeId: 'grey' }), ride({ surface: 'gravel' })])).toEqual([]);
  });
});

describe('usualSurface', () => {
  it('is that of the last ride, else that of the kind of bike', () => {
    const bike = { id: 'blue', kind: 'gravel' } as const;
    expect(usualSurface(bike, [ride({ bikeId: 'grey' }), ride({ surface: 'road' })])).toBe('road');
    expect(usualSurface(bike, [])).toBe('gravel');
    expect(usualSurface({ id: 'old', kind: 'cargo' }, [])).toBe('road');
  });
});
