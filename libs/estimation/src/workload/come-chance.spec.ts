import { seededRandom } from '../math/random';
import { comeChance } from './come-chance';

describe('comeChance', () => {
  it('starts at even odds and follows what is seen', () => {
    expect(comeChance([])).toBe(0.5);
    expect(comeChance(Array.from({ length: 96 }, () => ({ days: 3, came: true })))).toBeCloseTo(98 / 100, 12);
    expect(comeChance([{ days: 21, came: false }])).toBeCloseTo(2 / 7, 12);
    expect(comeChance([{ days: 15, came: true }])).toBeCloseTo(3 / 7, 12);
  });

  it('takes no more than twelve weeks of silence from one reminder', () => {
    expect(comeChance([{ days: 10_000, came: false }])).toBe(comeChance([{ days: 84, came: false }]));
    expect(comeChance([{ days: 10_000, came: true }])).toBe(comeChance([{ days: 84, came: false }]));
  });

  it.each([0.15, 0.4, 0.8])('finds the chance %d that riders were drawn with', (chance) => {
    const next = seededRandom(5);
    const answers = Array.from({ length: 2000 }, () => {
      let weeks = 0;
      while (weeks < 12 && next() >= chance) weeks++;
      return { days: weeks * 7 + 2, came: weeks < 12 };
    });
    expect(Math.abs(comeChance(answers) - chance)).toBeLessThan(0.03);
  });
});
