import { defaultFleetModel } from '@halfpitch/estimation';
import { toldModel } from './told-model';

it('tells what every workshop starts from', () => {
  const told = toldModel(defaultFleetModel());
  expect(told).toMatchObject({ learnedOn: null, rates: [], riding: { ownRiders: 0, shippedRiders: 16 } });
  expect(told.lives).toContainEqual({
    kind: 're-wax',
    start: 300,
    median: 300,
    observations: 0,
    low: null,
    high: null,
  });
});

it('tells what was learned beside it, and how sure that is', () => {
  const start = defaultFleetModel();
  const told = toldModel({
    ...start,
    version: 'learned-2026-11-30',
    life: {
      ...start.life,
      kinds: { ...start.life.kinds, 're-wax': { median: 240, observations: 41, logSe: 0.1 } },
    },
    elongation: {
      rate: {
        ...start.elongation.rate,
        'wet-oil': { ...start.elongation.rate['wet-oil'], commuter: { median: 0.16, logSd: 0.4, chains: 7 } },
      },
    },
    riding: { ...start.riding, riders: 23 },
  });
  expect(told.learnedOn).toBe('2026-11-30');
  const reWax = told.lives.find(({ kind }) => kind === 're-wax')!;
  expect(reWax).toMatchObject({ start: 300, median: 240, observations: 41 });
  // exp(±1.2816 × 0.1), by hand: 0.8797 and 1.1367.
  expect(reWax.low).toBeCloseTo(240 * 0.8797, 1);
  expect(reWax.high).toBeCloseTo(240 * 1.1367, 1);
  expect(told.rates).toEqual([
    { regime: 'wet-oil', bikeKind: 'commuter', start: 0.12, median: 0.16, chains: 7 },
  ]);
  expect(told.riding.ownRiders).toBe(23);
});
