import type { ReadingMethod } from '@halfpitch/estimation';
import { methodErrors } from '../../libs/estimation/src/elongation/methods';
import type { PlacedReading } from '../../libs/estimation/src/elongation/model';
import type { RatePrior } from '../../libs/estimation/src/elongation/priors';
import { Draw, drawFrom } from './random';

/** A made-up chain as the workshop would know it. */
export interface GeneratedChain {
  prior: RatePrior;
  readings: PlacedReading[];
  wearKm: number;
  limitPct: number;
}

const METHODS: ReadingMethod[] = ['steel-rule', 'three-point', 'two-point', 'digital', 'drop-in'];
const STEPS = [0.5, 0.75, 1];
const CONTRADICTORY = 0.1;

/** Chain number `seed`: one to three gauges, one to twelve readings, some of them go/no-go, baselines or contradictory. */
export function generateChain(seed: number): GeneratedChain {
  const draw = drawFrom(seed + 1);
  const prior = { median: draw.oneOf([0.04, 0.08, 0.12]), logSd: draw.oneOf([0.3, 0.5, 0.7]) };
  const rate = prior.median * Math.exp(draw.normal(0, prior.logSd));
  const runIn = 0.025 * Math.exp(draw.normal(0, 0.5));
  const limitPct = draw.oneOf(STEPS);
  const wearKm = draw.uniform(0.1, 1.2) * ((1000 * limitPct) / rate);
  const gauges = Array.from({ length: draw.whole(1, 3) }, (_, g) => gaugeOf(draw, `gauge ${g}`));
  const readings: PlacedReading[] = [];
  const count = draw.whole(1, 12);
  for (let i = 0; i < count; i++) {
    const gauge = draw.oneOf(gauges);
    const at = wearKm * draw.uniform(0.05, 1);
    const wrong = draw.chance(CONTRADICTORY) ? draw.uniform(-0.4, 0.4) : 0;
    readings.push(read(draw, gauge, `reading ${i}`, at, runIn + (rate * at) / 1000 + wrong));
  }
  if (draw.chance(0.3)) readings.push({ ...read(draw, gauges[0]!, 'new', 0, 0), baseline: true });
  return { prior, readings, wearKm, limitPct };
}

interface Gauge {
  gauge: string;
  method: ReadingMethod;
  offset: number;
}

function gaugeOf(draw: Draw, gauge: string): Gauge {
  const method = draw.oneOf(METHODS);
  const { offset, offsetSd } = methodErrors[method];
  return { gauge, method, offset: draw.normal(offset, offsetSd) };
}

function read(
  draw: Draw,
  { gauge, method, offset }: Gauge,
  id: string,
  wearKm: number,
  truth: number,
): PlacedReading {
  const { noiseSd } = methodErrors[method];
  const shown = () => truth + offset + draw.normal(0, noiseSd);
  const reading = { id, day: Math.round(wearKm), method, gauge, wearKm };
  if (method !== 'drop-in') {
    const places = draw.oneOf([1, 1, 3, 5]);
    return { ...reading, values: Array.from({ length: places }, shown) };
  }
  const value = shown();
  const lower = STEPS.filter((step) => step <= value).at(-1);
  const upper = STEPS.find((step) => step > value);
  return { ...reading, ...(lower !== undefined && { lower }), ...(upper !== undefined && { upper }) };
}
