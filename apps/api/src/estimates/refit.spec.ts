import { defaultFleetModel, defaultRidingModel } from '@halfpitch/estimation';
import type { ChainLesson, LifeObservation } from '@halfpitch/estimation';
import { refit, refitIsDue } from './refit';

const dry: LifeObservation = { kind: 're-wax', lubeKm: 160, arrival: 'dry' };

it('is due where nothing was learned yet, and a week after', () => {
  const model = (version: string) => ({ ...defaultFleetModel(), version });
  expect(refitIsDue(null, '2026-12-01')).toBe(true);
  expect(refitIsDue(model('default-1'), '2026-12-01')).toBe(true);
  expect(refitIsDue(model('learned-2026-11-25'), '2026-12-01')).toBe(false);
  expect(refitIsDue(model('learned-2026-11-24'), '2026-12-01')).toBe(true);
});

it('learns a shorter life from chains that came in dry, and is the same when done again', () => {
  const chain = (...lives: LifeObservation[]): ChainLesson[] => [
    { regime: 'immersion-wax', bikeKind: 'road', lives, readings: [] },
  ];
  const lives = new Map([
    ['a', chain(dry, dry)],
    ['b', chain(dry)],
  ]);
  const learned = refit(defaultRidingModel, lives, '2026-12-01');
  expect(learned.version).toBe('learned-2026-12-01');
  expect(learned.life.kinds['re-wax'].median).toBeLessThan(300);
  expect(learned.life.kinds['re-wax'].observations).toBe(3);
  expect(refit(defaultRidingModel, lives, '2026-12-01')).toEqual(learned);
});
