import { EstimationError, ImpossibleInputError } from '../errors';
import { CensoredLife, Curvature, intervalLikelihood } from './interval-likelihood';
import { logNormal, weibull } from './location-scale';

export interface CensoredFit {
  /** Location and scale of log life; the median life of a log-normal is exp(location). */
  location: number;
  scale: number;
  /** Standard errors by the observed information. */
  locationSe: number;
  scaleSe: number;
  logLikelihood: number;
}

const STEPS = 100;
const UNDETERMINED = 'These lives determine no maximum: some must be found spent and some still good.';

/**
 * Maximum likelihood of a log-normal or Weibull life from interval-censored lives (left- and right-censored among them),
 * without prior: Newton's method on location and log scale, damped so that every step gains.
 * @throws ImpossibleInputError on intervals that are none; EstimationError when the lives determine no maximum.
 */
export function fitCensored(
  lives: readonly CensoredLife[],
  distribution: 'log-normal' | 'weibull',
): CensoredFit {
  for (const { low, high, count = 1 } of lives) {
    if (!(low >= 0 && high > low && count >= 0 && Number.isFinite(low) && Number.isFinite(count)))
      throw new ImpossibleInputError(`A life from ${low} to ${high} (${count} times) cannot be.`);
  }
  const counted = lives.filter(({ count = 1 }) => count > 0);
  if (!counted.some(({ high }) => Number.isFinite(high)) || !counted.some(({ low }) => low > 0))
    throw new EstimationError(UNDETERMINED);
  const standard = distribution === 'weibull' ? weibull : logNormal;
  const at = (location: number, logScale: number) =>
    intervalLikelihood(lives, standard, location, Math.exp(logScale));
  let [location, logScale] = startingPoint(lives);
  let here = at(location, logScale);
  for (let i = 0; i < STEPS; i++) {
    const [da, db] = uphill(here);
    let share = Math.min(1, 2 / Math.max(Math.abs(da), Math.abs(db), 1e-9));
    let next = at(location + share * da, logScale + share * db);
    while (!(next.value >= here.value - 1e-12) && share > 1e-8) {
      share /= 2;
      next = at(location + share * da, logScale + share * db);
    }
    location += share * da;
    logScale += share * db;
    here = next;
    if (Math.abs(da) + Math.abs(db) < 1e-11) break;
  }
  return summary(location, logScale, here);
}

/** Newton's step where the log-likelihood is concave, the gradient's direction where it is not. */
function uphill({ gradient: [ga, gb], hessian: [aa, ab, bb] }: Curvature): [number, number] {
  const determinant = aa * bb - ab * ab;
  if (aa < 0 && determinant > 0)
    return [(ab * gb - bb * ga) / determinant, (ab * ga - aa * gb) / determinant];
  const length = Math.hypot(ga, gb) || 1;
  return [(0.5 * ga) / length, (0.5 * gb) / length];
}

/** Mean and sd of the logs of the intervals' finite ends. */
function startingPoint(lives: readonly CensoredLife[]): [location: number, logScale: number] {
  let [n, sum, squares] = [0, 0, 0];
  for (const { low, high, count = 1 } of lives) {
    for (const end of [low, high]) {
      if (!(end > 0 && Number.isFinite(end))) continue;
      n += count;
      sum += count * Math.log(end);
      squares += count * Math.log(end) ** 2;
    }
  }
  return [sum / n, Math.log(Math.max(Math.sqrt(Math.max(squares / n - (sum / n) ** 2, 0)), 0.2))];
}

function summary(location: number, logScale: number, { value, gradient, hessian }: Curvature): CensoredFit {
  const [aa, ab, bb] = hessian;
  const determinant = aa * bb - ab * ab;
  const scale = Math.exp(logScale);
  if (!(aa < 0 && determinant > 0) || Math.hypot(...gradient) > 1e-4 || scale < 1e-6)
    throw new EstimationError(
      'These lives determine no maximum: some must be found spent and some still good.',
    );
  return {
    location,
    scale,
    locationSe: Math.sqrt(-bb / determinant),
    scaleSe: scale * Math.sqrt(-aa / determinant),
    logLikelihood: value,
  };
}
