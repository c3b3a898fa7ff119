import { ElongationModel, PlacedReading } from './model';
import { readingChances, worstPlace } from './reading-likelihood';

/** Steps of a table per standard deviation of the noise: linear reading between them errs by 1/392 at most in the log. */
const STEPS_PER_SD = 7;
/** Beyond this many standard deviations a sound reading is out of the question: the table is flat from there on. */
const REACH = 6;

/** Log-likelihood of one reading, tabulated over what its gauge would show without noise. */
export interface ReadingTable {
  reading: PlacedReading;
  /** First value shown, %, and the step, %. */
  start: number;
  step: number;
  /** Table steps per node of the gauge's offset grid. */
  stride: number;
  log: Float64Array;
  /** Chance that the reading is wrong, at the same places. */
  wrong: Float64Array;
}

/** Tabulates a reading with a step that divides `nodeStep`, the distance of the offset grid's nodes. */
export function readingTable(reading: PlacedReading, nodeStep: number, model: ElongationModel): ReadingTable {
  const errors = model.methods[reading.method];
  const stride = Math.max(Math.ceil((nodeStep * STEPS_PER_SD) / errors.noiseSd), 1);
  const step = nodeStep / stride;
  const [low, high] = edges(reading);
  const start = low - REACH * errors.noiseSd;
  const length = Math.ceil((high - low + 2 * REACH * errors.noiseSd) / step) + 2;
  const log = new Float64Array(length);
  const wrong = new Float64Array(length);
  for (let i = 0; i < length; i++) {
    const chances = readingChances(reading, start + i * step, errors, model.wrongShare);
    const total = Math.max(chances.sound + chances.wrong, 1e-300);
    log[i] = Math.log(total);
    wrong[i] = chances.wrong / total;
  }
  return { reading, start, step, stride, log, wrong };
}

/** Where the likelihood changes: around the number, or around the go/no-go steps. */
function edges(reading: PlacedReading): [low: number, high: number] {
  const worst = worstPlace(reading);
  if (worst !== undefined) return [worst, worst];
  const { lower, upper } = reading;
  return [lower ?? upper!, upper ?? lower!];
}

/** Adds to `sums` one table's values at the offset nodes, when the first node shows `shown` %. */
export function addAlong(
  { start, step, stride }: ReadingTable,
  values: Float64Array,
  shown: number,
  sums: Float64Array,
): void {
  const last = values.length - 1;
  const place = (shown - start) / step;
  let i = Math.floor(place);
  const f = place - i;
  for (let j = 0; j < sums.length; j++, i += stride) {
    if (i < 0) sums[j]! += values[0]!;
    else if (i >= last) sums[j]! += values[last]!;
    else sums[j]! += values[i]! + f * (values[i + 1]! - values[i]!);
  }
}
