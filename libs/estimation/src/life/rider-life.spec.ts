import { defaultLife } from './default-life';
import { fitLife } from './fit-life';
import { isDoubtful, lifeQuantile, riderLife } from './rider-life';
import type { LifeObservation } from './rider-life';

const turning = (lubeKm: number): LifeObservation => ({ kind: 're-wax', lubeKm, arrival: 'turning' });
const medianOf = (seen: LifeObservation[]) => lifeQuantile(riderLife('re-wax', seen, defaultLife), 0.5);
/** A year's log came onto a chain whose treatments were never recorded, and it was found turning. */
const aYear = turning(6000);

describe('an arrival that no life explains', () => {
  it('is doubted, and believable ones are not', () => {
    expect(isDoubtful(aYear, defaultLife)).toBe(true);
    expect(isDoubtful({ kind: 're-wax', lubeKm: 2500, arrival: 'quiet' }, defaultLife)).toBe(true);
    expect(isDoubtful({ kind: 're-wax', lubeKm: 4, arrival: 'dry' }, defaultLife)).toBe(true);
    for (const lubeKm of [150, 300, 600]) expect(isDoubtful(turning(lubeKm), defaultLife)).toBe(false);
    expect(isDoubtful({ kind: 're-wax', lubeKm: 6000, arrival: 'dry' }, defaultLife)).toBe(false);
    expect(isDoubtful({ kind: 're-wax', lubeKm: 6000, arrival: 'not-seen' }, defaultLife)).toBe(false);
  });

  it('moves the rider’s life little, where a believable one moves it', () => {
    expect(medianOf([])).toBeCloseTo(300, 6);
    expect(medianOf([aYear])).toBeLessThan(310);
    expect(medianOf([turning(400)])).toBeGreaterThan(320);
  });

  it('does not teach the workshop’s other riders long lives', () => {
    const sound = Array.from({ length: 12 }, () => [turning(280), turning(310), turning(290)]);
    const { median } = fitLife(sound, defaultLife).kinds['re-wax'];
    const spoilt = fitLife([...sound, [aYear]], defaultLife).kinds['re-wax'].median;
    expect(Math.abs(spoilt / median - 1)).toBeLessThan(0.02);
  });
});
