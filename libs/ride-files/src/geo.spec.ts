import fc from 'fast-check';
import { haversineM, onEarth } from './geo';

const place = fc.record({
  lat: fc.double({ min: -90, max: 90, noNaN: true }),
  lon: fc.double({ min: -180, max: 180, noNaN: true }),
});

describe('haversineM', () => {
  it('gives the published 2 887 km between two airports (36.12 N 86.67 W, 33.94 N 118.40 W; radius 6 372.8 km; memory)', () => {
    // Published for a radius of 6 372.8 km: 2887.2600 km (memory: the widely used check value of this formula).
    const published = (2887.26 * 6371.0088) / 6372.8;
    expect(haversineM(36.12, -86.67, 33.94, -118.4) / 1000).toBeCloseTo(published, 1);
  });

  it('gives a quarter of the meridian from equator to pole (computed: pi / 2 times the radius)', () => {
    expect(haversineM(0, 0, 90, 0)).toBeCloseTo((Math.PI / 2) * 6_371_008.8, 3);
  });

  it('is symmetric, never negative and at most half way round', () => {
    fc.assert(
      fc.property(place, place, (a, b) => {
        const there = haversineM(a.lat, a.lon, b.lat, b.lon);
        expect(haversineM(b.lat, b.lon, a.lat, a.lon)).toBeCloseTo(there, 6);
        expect(there).toBeGreaterThanOrEqual(0);
        expect(there).toBeLessThanOrEqual(Math.PI * 6_371_008.8 + 1);
      }),
    );
  });
});

it('knows which degrees exist', () => {
  expect(onEarth(90, -180)).toBe(true);
  expect(onEarth(90.1, 0)).toBe(false);
  expect(onEarth(NaN, 0)).toBe(false);
});
