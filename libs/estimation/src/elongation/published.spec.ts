import { gaugeOf } from './gauge';
import { logLikelihood } from './grid';
import { defaultElongationModel, ElongationModel, PlacedReading } from './model';
import { elongationPosterior } from './posterior';

/** A gauge with no offset to speak of and known noise, on chains without run-in or wrong readings. */
function exactGauge(noiseSd: number): ElongationModel {
  return {
    runIn: { median: 1e-7, logSd: 0.01 },
    methods: { ...defaultElongationModel.methods, digital: { offset: 0, offsetSd: 1e-4, noiseSd } },
    wrongShare: 0,
  };
}

const reading = (wearKm: number, value: number): PlacedReading => ({
  id: String(wearKm),
  day: 0,
  method: 'digital',
  values: [value],
  wearKm,
});

describe('the likelihood of number readings', () => {
  it('gives the Bayesian slope with known noise: mean 62/57, variance 1/57 (Bishop, PRML 3.50-51, memory; computed)', () => {
    const model = exactGauge(0.5);
    const readings = [reading(1000, 1), reading(2000, 2), reading(3000, 3.5)];
    const slopes = Float64Array.from({ length: 801 }, (_, i) => -1 + i * 0.005);
    const log = logLikelihood([gaugeOf(readings, model, 1e-6)], slopes, Float64Array.of(1e-7));
    const weights = log.map((value, i) => Math.exp(value - log[420]! - 0.5 * slopes[i]! ** 2));
    const total = weights.reduce((sum, w) => sum + w, 0);
    const mean = weights.reduce((sum, w, i) => sum + w * slopes[i]!, 0) / total;
    const variance = weights.reduce((sum, w, i) => sum + w * (slopes[i]! - mean) ** 2, 0) / total;
    expect(mean).toBeCloseTo(62 / 57, 3);
    expect(variance).toBeCloseTo(1 / 57, 4);
  });
});

/** Slopes through the origin per 1,000 h and hours to 10 %, 15 lasers (Meeker & Escobar; SMRD2Data read, computed). */
const LASERS = [
  [2.697618, 3707.0],
  [2.396105, 4173.4],
  [1.778918, 5621.4],
  [1.671525, 5982.6],
  [1.840476, 5433.4],
  [2.767919, 3612.8],
  [1.628306, 6141.4],
  [1.558733, 6415.5],
  [1.974022, 5065.8],
  [3.023371, 3307.6],
  [1.8984, 5267.6],
  [2.020897, 4948.3],
  [2.091484, 4781.3],
  [1.718375, 5819.5],
  [1.633633, 6121.3],
] as const;

/** A tenth of the lasers' scale: a chain never lengthens by 10 %. */
describe('degradation to a limit (GaAs lasers)', () => {
  it.each(LASERS)('a slope of %d reaches 10 %% after %d hours', (slope, hours) => {
    const readings = [1000, 2000, 4000].map((at) => reading(at, (0.1 * slope * at) / 1000));
    const posterior = elongationPosterior(readings, { median: 0.2, logSd: 0.5 }, exactGauge(0.015));
    expect(Math.abs(posterior.rate.p50 / (0.1 * slope) - 1)).toBeLessThan(0.002);
    expect(Math.abs(posterior.wearKmLeft(0, 1, 0.5) / hours - 1)).toBeLessThan(0.002);
  });
});

/**
 * One commuter's three chains (robobiking.wordpress.com, 2016-17, read): km and caliper mm between rollers about 11
 * pitches apart; new reads about 132.4. The play is the gauge's offset; his rule of thumb gives 0.14 % per 1,000 km in
 * ordinary weather and 0.57 % in salted winters.
 */
const COMMUTER = {
  A: [1350, 132.65, 2450, 133.1, 2850, 133.1, 3700, 133.4, 3800, 133.4, 4100, 133.6],
  B: [1200, 132.7, 1700, 132.8, 2700, 133.0, 3000, 133.1, 3250, 133.1, 3750, 133.5, 3900, 133.6],
  C: [1600, 132.8, 1850, 133.0, 2100, 133.0, 2350, 133.1, 2850, 133.5, 3250, 133.5, 4000, 134.2],
};

describe('one commuter’s chains', () => {
  it.each(Object.entries(COMMUTER))('chain %s wears between his rules for dry and for winter', (_, log) => {
    const readings: PlacedReading[] = [];
    for (let i = 0; i < log.length; i += 2)
      readings.push({
        id: String(i),
        day: i,
        method: 'two-point',
        gauge: 'caliper',
        values: [((log[i + 1]! - 132.4) / 139.7) * 100],
        wearKm: log[i]!,
      });
    const { rate } = elongationPosterior(readings, { median: 0.12, logSd: 0.5 });
    expect(rate.p50).toBeGreaterThan(0.14);
    expect(rate.p50).toBeLessThan(0.57);
    expect(rate.p10).toBeLessThan(rate.p50);
    expect(rate.p90).toBeGreaterThan(rate.p50);
  });
});
