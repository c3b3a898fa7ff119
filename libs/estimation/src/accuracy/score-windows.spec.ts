import { seededRandom } from '../math/random';
import { scoreWindows } from './score-windows';
import { windowOutcome, type Seen } from './window-outcome';

const window = { p10: 100, p50: 110, p90: 130 };
const seen = (...cases: [day: number, seen: Seen][]) =>
  cases.map(([day, what]) => windowOutcome(window, day, what));

describe('scoreWindows', () => {
  it('counts what held, and takes the share from known days only', () => {
    const score = scoreWindows(
      seen(
        [95, 'then'],
        [105, 'then'],
        [112, 'then'],
        [125, 'then'],
        [140, 'after'],
        [105, 'after'],
        [90, 'before'],
      ),
    );
    expect(score).toMatchObject({ cases: 7, held: 3, sooner: 2, later: 1, open: 1, medianMissDays: -1.5 });
    expect(score.known).toMatchObject({ n: 4, share: 0.75 });
  });

  it('says nothing of nothing', () => {
    expect(scoreWindows([])).toMatchObject({ cases: 0, known: null, medianMissDays: null });
  });

  it('finds the promise kept where due days fall as promised, however censored', () => {
    const next = seededRandom(11);
    const days = [60, 100, 110, 130, 200] as const;
    const chances = [0, 0.1, 0.5, 0.9, 1] as const;
    const dueDay = () => {
      const u = next();
      const i = chances.findIndex((chance) => chance > u);
      const within = (u - chances[i - 1]!) / (chances[i]! - chances[i - 1]!);
      return days[i - 1]! + within * (days[i]! - days[i - 1]!);
    };
    const outcomes = Array.from({ length: 4000 }, () => {
      const due = dueDay();
      const look = 60 + 140 * next();
      if (next() < 0.4) return windowOutcome(window, due, 'then');
      return windowOutcome(window, look, look < due ? 'after' : 'before');
    });
    const { parts, known } = scoreWindows(outcomes);
    [0.1, 0.4, 0.4, 0.1].forEach((share, part) => expect(Math.abs(parts[part]! - share)).toBeLessThan(0.03));
    expect(known!.low).toBeLessThan(0.8);
    expect(known!.high).toBeGreaterThan(0.8);
  });
});
