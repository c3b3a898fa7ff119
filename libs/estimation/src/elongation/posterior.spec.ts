import * as fc from 'fast-check';
import { ImpossibleInputError } from '../errors';
import { doubtedReadings } from './doubted';
import type { PlacedReading } from './model';
import { narrowing } from './narrowing';
import { elongationPosterior } from './posterior';

const prior = { median: 0.04, logSd: 0.5 };

const reading = (id: string, wearKm: number, change: Partial<PlacedReading>): PlacedReading => ({
  id,
  day: Math.round(20_000 + wearKm / 20),
  method: 'three-point',
  gauge: 'bench',
  wearKm,
  ...change,
});

const width = (readings: PlacedReading[]) => {
  const { rate } = elongationPosterior(readings, prior);
  return rate.p90 - rate.p10;
};

describe('elongationPosterior', () => {
  it('is the prior where nothing was read', () => {
    const { rate } = elongationPosterior([], prior);
    expect(rate.p50).toBeCloseTo(0.04, 6);
    expect(rate.p90 / rate.p50).toBeCloseTo(Math.exp(0.5 * 1.2815516), 3);
  });

  it('does not average a gauge’s offset away: ten readings by one gauge say less than by ten gauges', () => {
    const by = (gauge: (i: number) => string) =>
      Array.from({ length: 10 }, (_, i) => reading(String(i), 5000, { gauge: gauge(i), values: [0.225] }));
    expect(width(by(() => 'one'))).toBeGreaterThan(1.3 * width(by((i) => `gauge ${i}`)));
  });

  it('learns a gauge’s offset from a baseline reading of the new chain', () => {
    const worn = reading('worn', 5000, { method: 'two-point', values: [0.4] });
    const fresh = reading('new', 0, { method: 'two-point', values: [0.2], baseline: true });
    expect(width([fresh, worn])).toBeLessThan(width([worn]));
    expect(elongationPosterior([fresh, worn], prior).rate.p50).toBeLessThan(
      elongationPosterior([worn], prior).rate.p50,
    );
  });

  it('takes a go/no-go answer for the interval it is', () => {
    const passes = elongationPosterior([reading('a', 8000, { method: 'drop-in', upper: 0.5 })], prior);
    const stops = elongationPosterior([reading('a', 8000, { method: 'drop-in', lower: 0.75 })], prior);
    expect(passes.rate.p50).toBeLessThan(0.04);
    expect(stops.rate.p50).toBeGreaterThan(0.06);
    expect(passes.chancePast(8000, 0.5)).toBeLessThan(0.2);
  });

  it('expects the worst of five places to show more than one place would', () => {
    const one = elongationPosterior([reading('a', 5000, { values: [0.3] })], prior);
    const five = elongationPosterior([reading('a', 5000, { values: [0.3, 0.29, 0.28, 0.27, 0.3] })], prior);
    expect(five.elongationAt(5000).p50).toBeLessThan(one.elongationAt(5000).p50);
  });

  it('doubts a reading by which the chain got shorter, says why, and is hardly moved by it', () => {
    const sound = [2000, 4000, 6000, 8000].map((km) =>
      reading(`at ${km}`, km, { values: [0.025 + 0.00004 * km] }),
    );
    const odd = reading('odd', 7000, { values: [0.02] });
    const posterior = elongationPosterior([...sound, odd], prior);
    const doubted = doubtedReadings([...sound, odd], posterior);
    expect(doubted.map(({ readingId }) => readingId)).toEqual(['odd']);
    expect(doubted[0]!.because).toContain('a worn chain never gets shorter');
    const without = elongationPosterior(sound, prior).rate;
    expect(Math.abs(posterior.rate.p50 - without.p50)).toBeLessThan(0.1 * (without.p90 - without.p10));
  });

  it('doubts nothing where the readings agree', () => {
    const sound = [2000, 4000, 6000].map((km) => reading(`at ${km}`, km, { values: [0.025 + 0.00004 * km] }));
    expect(doubtedReadings(sound, elongationPosterior(sound, prior))).toEqual([]);
  });

  it('tells that a digital gauge would narrow the window more than a rule', () => {
    const posterior = elongationPosterior([], prior);
    const rule = narrowing(posterior, 5000, 0.5, ['steel-rule'])!;
    const digital = narrowing(posterior, 5000, 0.5, ['digital'])!;
    expect(digital.factor).toBeLessThan(rule.factor);
    expect(narrowing(posterior, 5000, 0.5, ['steel-rule', 'digital'])).toEqual(digital);
  });

  it('foretells by how much a reading narrows: as a window with that reading turns out', () => {
    const foretold = narrowing(elongationPosterior([], prior), 5000, 0.5, ['three-point'])!.factor;
    const logWidth = (readings: PlacedReading[]) => {
      const posterior = elongationPosterior(readings, prior);
      return Math.log(posterior.wearKmLeft(0, 0.5, 0.9) / posterior.wearKmLeft(0, 0.5, 0.1));
    };
    const taken = logWidth([reading('a', 5000, { values: [0.23] })]) / logWidth([]);
    expect(taken / foretold).toBeGreaterThan(0.7);
    expect(taken / foretold).toBeLessThan(1.4);
  });

  it('keeps its levels in order and finite whatever was read', () => {
    const anyReading = fc.record({
      wearKm: fc.double({ min: 0, max: 60_000, noNaN: true }),
      value: fc.double({ min: -1, max: 5, noNaN: true }),
      kind: fc.constantFrom('number', 'above', 'below', 'baseline'),
      method: fc.constantFrom('steel-rule' as const, 'two-point' as const, 'digital' as const),
    });
    fc.assert(
      fc.property(fc.array(anyReading, { maxLength: 6 }), fc.constantFrom(0.5, 0.75, 1), (list, limit) => {
        const readings = list.map(({ wearKm, value, kind, method }, i) => {
          const said =
            kind === 'above' ? { lower: value } : kind === 'below' ? { upper: value } : { values: [value] };
          return reading(String(i), wearKm, { ...said, method, baseline: kind === 'baseline' });
        });
        const posterior = elongationPosterior(readings, prior);
        const left = [0.1, 0.5, 0.9].map((p) => posterior.wearKmLeft(3000, limit, p));
        const { rate } = posterior;
        const now = posterior.elongationAt(3000);
        for (const [low, middle, high] of [
          left,
          [rate.p10, rate.p50, rate.p90],
          [now.p10, now.p50, now.p90],
        ]) {
          expect([low, middle, high].every(Number.isFinite)).toBe(true);
          expect(low! <= middle! && middle! <= high!).toBe(true);
        }
        doubtedReadings(readings, posterior);
      }),
      { numRuns: 60, seed: 12 },
    );
  });

  it('stays finite with a thousand readings', () => {
    const readings = Array.from({ length: 1000 }, (_, i) =>
      reading(String(i), 8 * i, { values: [0.025 + 0.00032 * i + 0.03 * Math.sin(i)] }),
    );
    const { rate } = elongationPosterior(readings, prior);
    expect(rate.p50).toBeGreaterThan(0.035);
    expect(rate.p50).toBeLessThan(0.045);
    expect(rate.p10).toBeLessThan(rate.p90);
  });

  it('never has more wear km left after more wear km', () => {
    const posterior = elongationPosterior([reading('a', 4000, { values: [0.2] })], prior);
    const left = [4000, 4500, 6000, 9000].map((km) => posterior.wearKmLeft(km, 0.5, 0.5));
    expect([...left].sort((a, b) => b - a)).toEqual(left);
  });

  it.each([
    ['an elongation of 40 %', { values: [40] }],
    ['no number', { values: [NaN] }],
    ['a reading that says nothing', {}],
    ['above 0.75 and below 0.5 at once', { lower: 0.75, upper: 0.5 }],
    ['wear km below nothing', { values: [0.1], wearKm: -1 }],
  ])('refuses %s', (_, change) => {
    expect(() => elongationPosterior([reading('a', 1000, change)], prior)).toThrow(ImpossibleInputError);
  });
});
