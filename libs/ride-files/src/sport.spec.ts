import { isCycling, isIndoor, sportInName, sportWords, surfaceInSport } from './sport';

it.each([
  ['cycling', true],
  ['cycling/gravelCycling', true],
  ['fitnessEquipment/indoorCycling', true],
  ['eBiking/eBikeMountain', true],
  ['Biking', true],
  ['running/trail', false],
  ['fitnessEquipment/indoorRowing', false],
  ['transition/runToBikeTransition', false],
  ['motorcycling', false],
  ['Other', null],
  ['generic/generic', null],
  [null, null],
])('%s: cycling %s', (sport, cycling) => {
  expect(isCycling(sport)).toBe(cycling);
});

it('writes a sport as people say it', () => {
  expect(sportWords('fitnessEquipment/indoorRowing')).toBe('fitness equipment, indoor rowing');
  expect(sportWords('running/generic')).toBe('running');
});

it('tells indoor riding and the surface where the words do', () => {
  expect([isIndoor('cycling/virtualActivity'), isIndoor('cycling/road')]).toEqual([true, null]);
  expect(
    ['cycling/gravelCycling', 'cycling/mountain', 'cycling/road', 'cycling/indoorCycling', 'cycling'].map(
      surfaceInSport,
    ),
  ).toEqual(['gravel', 'mountain', 'road', 'indoor', null]);
});

it('takes a track’s name for its sport only when it is hardly more than that', () => {
  expect(sportInName('Morning Run')).toBe('Morning Run');
  expect(sportInName('Long way round to the run-down mill')).toBeNull();
  expect(sportInName('Innrunde')).toBeNull();
  expect(sportInName(null)).toBeNull();
});
