import { EstimationError } from '../errors';
import { fitCensored } from './fit-censored';
import type { CensoredLife } from './interval-likelihood';

/** Ends of inspection intervals, months, and cracks found in each; 73 of 167 survive (Nelson 1982; data read). */
const CRACKED_ENDS = [6.12, 19.92, 29.64, 35.4, 39.72, 45.24, 52.32, 63.48];
const CRACKED_FOUND = [5, 16, 12, 18, 18, 2, 6, 17];
const cracked: CensoredLife[] = [
  ...CRACKED_ENDS.map((high, i) => ({ low: CRACKED_ENDS[i - 1] ?? 0, high, count: CRACKED_FOUND[i]! })),
  { low: 63.48, high: Infinity, count: 73 },
];

/** Turbine wheels, hundred hours: cracked or not when looked at once: just what quiet and dry on arrival are (data read). */
const HOURS = [4, 10, 14, 18, 22, 26, 30, 34, 38, 42, 46];
const WITH_CRACK = [0, 4, 2, 7, 5, 9, 9, 6, 22, 21, 21];
const WITHOUT = [39, 49, 31, 66, 25, 30, 33, 7, 12, 19, 15];
const turbine: CensoredLife[] = HOURS.flatMap((t, i) => [
  { low: 0, high: t, count: WITH_CRACK[i]! },
  { low: t, high: Infinity, count: WITHOUT[i]! },
]);

/** Heat exchanger tubes, years (Meeker & Escobar; data read in wqmeeker/SMRD2Data). */
const tubes: CensoredLife[] = [
  [0, 1, 1],
  [1, 2, 2],
  [2, 3, 2],
  [3, Infinity, 95],
  [0, 1, 2],
  [1, 2, 3],
  [2, Infinity, 95],
  [0, 1, 1],
  [1, Infinity, 99],
].map(([low, high, count]) => ({ low: low!, high: high!, count: count! }));

// Point, standard errors and log-likelihood: computed with R survival and scipy; the first also read in R's own tests.
it.each([
  ['cracked parts', cracked, 'weibull', 4.272357, 0.673234, -309.66841],
  ['cracked parts', cracked, 'log-normal', 4.026854, 0.998525, -311.91478],
  ['turbine wheels', turbine, 'log-normal', 3.699908, 0.719886, -190.73155],
  ['turbine wheels', turbine, 'weibull', 3.845397, 0.459605, -189.28719],
  ['heat exchanger', tubes, 'weibull', 3.16209, 0.74321, -54.41471],
  ['heat exchanger', tubes, 'log-normal', 3.73757, 1.69629, -54.35047],
] as const)(
  '%s, %#: location, scale and log-likelihood as published',
  (_, lives, as, location, scale, value) => {
    const fit = fitCensored(lives, as);
    expect(fit.location).toBeCloseTo(location, 4);
    expect(fit.scale).toBeCloseTo(scale, 4);
    expect(fit.logLikelihood).toBeCloseTo(value, 4);
  },
);

it('gives the standard errors as published (cracked parts, Weibull; turbine wheels, log-normal)', () => {
  const weibull = fitCensored(cracked, 'weibull');
  expect(weibull.locationSe).toBeCloseTo(0.0744, 4);
  expect(weibull.scaleSe).toBeCloseTo(0.06642, 4);
  expect(Math.exp(weibull.location)).toBeCloseTo(71.6904, 2);
  expect(1 / weibull.scale).toBeCloseTo(1.48537, 4);
  expect(fitCensored(turbine, 'log-normal').locationSe).toBeCloseTo(0.0708, 4);
});

it('says so where the lives determine nothing, and refuses what cannot be', () => {
  expect(() => fitCensored([{ low: 100, high: Infinity }], 'log-normal')).toThrow(EstimationError);
  expect(() => fitCensored([{ low: 5, high: 3 }], 'weibull')).toThrow('from 5 to 3');
});
