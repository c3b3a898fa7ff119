import { normalQuantile } from '../math/normal';
import { seededRandom } from '../math/random';
import type { LifeModel } from '../types';
import { defaultLife } from './default-life';
import { fitLife, fitLifeWithErrors, RiderLives } from './fit-life';
import type { LifeObservation } from './rider-life';

const FLEETS = 500;
const RIDERS = 24;
const VISITS = 6;

/** A fleet as it would be found on arrival: riders come in at some point about the median life of what they have. */
function generatedFleet(truth: LifeModel, random: () => number): RiderLives[] {
  const normal = () => normalQuantile(Math.min(Math.max(random(), 1e-9), 1 - 1e-9));
  return Array.from({ length: RIDERS }, () => {
    const effect = truth.logSdBetween * normal();
    return Array.from({ length: VISITS }, (): LifeObservation => {
      const kind = random() < 0.5 ? 're-wax' : 'oil-wet';
      const { median } = truth.kinds[kind];
      const life = median * Math.exp(effect + truth.logSdWithin * normal());
      const lubeKm = median * Math.exp(1.2 * (random() - 0.5));
      // Turning means that the life lies between 0.85 and 1.1 of what was ridden; outside it is plainly quiet or dry.
      const arrival = life > 1.1 * lubeKm ? 'quiet' : life > 0.85 * lubeKm ? 'turning' : 'dry';
      return {
        kind,
        lubeKm: arrival === 'quiet' ? 1.1 * lubeKm : arrival === 'dry' ? 0.85 * lubeKm : lubeKm,
        arrival,
      };
    });
  });
}

it('recovers what generated fleets were made of: 90 % intervals hold 86 to 94 % of the truths in 500 fleets', () => {
  const random = seededRandom(7);
  const between = (low: number, high: number) => low + (high - low) * random();
  const z = normalQuantile(0.95);
  const hits: Record<string, number> = {};
  const note = (what: string, estimate: number, truth: number, se: number) => {
    hits[what] = (hits[what] ?? 0) + (Math.abs(estimate - truth) <= z * se ? 1 : 0);
  };
  for (let fleet = 0; fleet < FLEETS; fleet++) {
    const truth: LifeModel = {
      kinds: {
        ...defaultLife.kinds,
        're-wax': { median: 300 * Math.exp(between(-0.4, 0.4)), observations: 0 },
        'oil-wet': { median: 200 * Math.exp(between(-0.4, 0.4)), observations: 0 },
      },
      logSdWithin: between(0.28, 0.45),
      logSdBetween: between(0.18, 0.35),
    };
    const { model, standardErrors } = fitLifeWithErrors(generatedFleet(truth, random), defaultLife);
    for (const kind of ['re-wax', 'oil-wet'] as const) {
      const [estimate, real] = [model, truth].map(({ kinds }) => Math.log(kinds[kind].median));
      note(kind, estimate!, real!, standardErrors.kinds[kind]!);
    }
    note('within', Math.log(model.logSdWithin), Math.log(truth.logSdWithin), standardErrors.logWithin);
    note('between', Math.log(model.logSdBetween), Math.log(truth.logSdBetween), standardErrors.logBetween);
  }
  const shares = Object.values(hits).map((count) => count / FLEETS);
  const pooled = shares.reduce((sum, share) => sum + share, 0) / shares.length;
  expect(pooled).toBeGreaterThan(0.86);
  expect(pooled).toBeLessThan(0.94);
  for (const kind of ['re-wax', 'oil-wet']) {
    expect(hits[kind]! / FLEETS).toBeGreaterThan(0.86);
    expect(hits[kind]! / FLEETS).toBeLessThan(0.94);
  }
});

it('stays with what it started from where nothing was seen, and counts what was', () => {
  expect(fitLife([], defaultLife)).toEqual(defaultLife);
  const dry: LifeObservation = { kind: 're-wax', lubeKm: 150, arrival: 'dry' };
  const { kinds } = fitLife([[dry, dry], [dry]], defaultLife);
  expect(kinds['re-wax'].observations).toBe(3);
  expect(kinds['re-wax'].median).toBeLessThan(300);
  expect(kinds['oil-wet']).toEqual(defaultLife.kinds['oil-wet']);
});
