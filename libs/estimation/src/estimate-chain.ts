import { checkHistory } from './check-history';
import { rideFactor } from './distance/equivalent-km';
import { dueCdf, dueWindow } from './due/due-distribution';
import { chainAlerts } from './due/alerts';
import { whyMoved } from './due/reasons';
import { elongationCurve } from './elongation/curve';
import { doubtedReadings } from './elongation/doubted';
import { narrowing } from './elongation/narrowing';
import { elongationPosterior, PlacedReading } from './elongation/posterior';
import { lifeQuantile, riderLife } from './life/rider-life';
import { currentTreatment, lifeObservations } from './life/treatments';
import { weightedBand } from './math/weighted';
import { forecastRiding } from './riding';
import type { ChainEstimate, ChainHistory, Factor, Factors, FleetModel } from './types';
import { chainUsage } from './usage';

const LIFE_ATOMS = 24;

/** Everything the product says of one chain today. Pure: the same history and model give the same digits. */
export function estimateChain(history: ChainHistory, fleet: FleetModel): ChainEstimate {
  checkHistory(history);
  const { today, limitPct, regime, bikeKind } = history;
  const usage = chainUsage(history, fleet.factors);
  const forecast = forecastRiding(history.bikeRides, today, fleet.riding, history.planned);
  const perKm = factorAhead(history, fleet.factors);

  const treatment = currentTreatment(history);
  const life = riderLife(treatment.kind, lifeObservations(history, usage), fleet.life);
  const lubeKmUsed = usage.lubeKmBetween(treatment.since, today);
  const lives = Array.from({ length: LIFE_ATOMS }, (_, i) => lifeQuantile(life, (i + 0.5) / LIFE_ATOMS));
  const lubeLeft = { values: lives.map((l) => (l - lubeKmUsed) / perKm.lube), weights: lives.map(() => 1) };
  const limitDays = history.calendarLimitDays[regime];
  const lubrication = history.fitted
    ? dueWindow(dueCdf(lubeLeft, forecast), today, limitDays === null ? null : treatment.since + limitDays)
    : null;

  const prior = fleet.elongation.rate[regime][bikeKind];
  const readings: PlacedReading[] = history.readings.map((r) => ({ ...r, wearKm: usage.wearKmAt(r.day) }));
  const posterior = elongationPosterior(readings, prior);
  const wearLeft = posterior.wearKmLeft(usage.wearKm, limitPct);
  const kmLeft = wearLeft.values.map((km) => km / perKm.wear / Math.max(history.shareOfRiding, 0.01));
  const replacement = dueWindow(dueCdf(condense(kmLeft, wearLeft.weights), forecast), today, null);

  const wearKmLeft = weightedBand(
    wearLeft.values.map((km) => Math.max(km, 0)),
    wearLeft.weights,
  );
  const state = { lubrication, replacement, forecast, perKm, usage, treatment };
  return {
    wearKm: usage.wearKm,
    totalKm: usage.totalKm,
    unloggedKm: usage.unloggedKm,
    lubrication,
    replacement,
    treatment: {
      lubeKmUsed,
      life: { p10: lifeQuantile(life, 0.1), p50: lifeQuantile(life, 0.5), p90: lifeQuantile(life, 0.9) },
      shareUsed: lubeKmUsed / lifeQuantile(life, 0.5),
      since: treatment.since,
      kind: treatment.given,
    },
    elongation: {
      now: posterior.elongationAt(usage.wearKm),
      rate: posterior.rate,
      wearKmLeft,
      chancePast: posterior.chancePast(usage.wearKm, limitPct),
      curve: elongationCurve(history, usage, posterior, wearKmLeft.p90, forecast, perKm.wear),
      doubted: doubtedReadings(readings, posterior),
    },
    kmPerWeek: forecast.kmPerWeek,
    reasons: whyMoved(history, fleet.factors, state),
    alerts: chainAlerts(history, state, posterior, lubeKmUsed / lifeQuantile(life, 0.5)),
    narrows: narrowing(readings, prior, posterior, usage.wearKm, limitPct),
  };
}

/** What a km ahead will count for: the last year's rides on this bike, steadied by 200 km of ordinary riding. */
function factorAhead({ bikeRides, rides, today }: ChainHistory, factors: Factors): Factor {
  const sums = { km: 200, lube: 200 * 1.15, wear: 200 * 1.15 };
  for (const ride of bikeRides.length > 0 ? bikeRides : rides) {
    if (ride.day > today || ride.day <= today - 365) continue;
    const factor = rideFactor(ride, factors);
    sums.km += ride.km;
    sums.lube += ride.km * factor.lube;
    sums.wear += ride.km * factor.wear;
  }
  return { lube: sums.lube / sums.km, wear: sums.wear / sums.km };
}

/** Many weighted atoms as 24 equally likely ones and the share that is due already, so that the forecast is asked less often. */
function condense(values: readonly number[], weights: readonly number[]) {
  const order = values.map((_, i) => i).sort((i, j) => values[i]! - values[j]!);
  const total = weights.reduce((sum, w) => sum + w, 0);
  const atoms: number[] = [];
  const shares: number[] = [];
  let group = 0;
  let sum = 0;
  for (const i of order) {
    group += weights[i]! / total;
    sum += (weights[i]! / total) * values[i]!;
    if (group < 1 / LIFE_ATOMS) continue;
    atoms.push(sum / group);
    shares.push(group);
    group = sum = 0;
  }
  if (group > 0) {
    atoms.push(sum / group);
    shares.push(group);
  }
  return { values: atoms, weights: shares };
}
