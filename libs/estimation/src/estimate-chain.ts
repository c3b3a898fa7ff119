import { checkHistory } from './check-history';
import { factorAhead } from './distance/factor-ahead';
import { chainAlerts } from './due/alerts';
import { dueCdf, dueWindow } from './due/due-distribution';
import { atomsOf } from './due/km-left';
import { lubricationWindow } from './due/lubrication';
import { whyMoved } from './due/reasons';
import type { DueState } from './due/state';
import { elongationCurve } from './elongation/curve';
import { doubtedReadings } from './elongation/doubted';
import { narrowing } from './elongation/narrowing';
import { elongationPosterior } from './elongation/posterior';
import { lifeQuantile, riderLife } from './life/rider-life';
import { currentTreatment, doubtfulArrival, lifeObservations } from './life/treatments';
import { sparseQuantile } from './math/sparse-quantile';
import { placedReadings } from './placed';
import { forecastRiding } from './riding';
import type { ChainEstimate, ChainHistory, FleetModel } from './types';
import { chainUsage } from './usage';

/** A chain that hardly ever gets its turn still carries this share of the riding. */
const LEAST_SHARE = 0.01;

/** Everything the product says of one chain today. Pure: the same history and model give the same digits. */
export function estimateChain(history: ChainHistory, fleet: FleetModel): ChainEstimate {
  checkHistory(history);
  const { today, limitPct, regime, bikeKind } = history;
  const usage = chainUsage(history, fleet.factors);
  const forecast = forecastRiding(history.bikeRides, today, fleet.riding, history.planned);
  const perKm = factorAhead(history, fleet.factors);

  const treatment = currentTreatment(history);
  const looks = lifeObservations(history, usage);
  const life = riderLife(treatment.kind, looks, fleet.life);
  const lubeKmUsed = usage.lubeKmBetween(treatment.since, today);
  const limitDays = history.calendarLimitDays[regime];
  const running = { life, since: treatment.since, lubeKmUsed, lubePerKm: perKm.lube, limitDays };
  const lubrication = history.fitted ? lubricationWindow(running, today, forecast) : null;

  const prior = fleet.elongation.rate[regime][bikeKind];
  const readings = placedReadings(history, usage);
  const posterior = elongationPosterior(readings, prior);
  const left = sparseQuantile((p) => posterior.wearKmLeft(usage.wearKm, limitPct, p));
  const kmPerWearKm = 1 / (perKm.wear * Math.max(history.shareOfRiding, LEAST_SHARE));
  const replacement = dueWindow(
    dueCdf(
      atomsOf((p) => left(p) * kmPerWearKm),
      forecast,
    ),
    today,
    null,
  );

  const wearKmLeft = {
    p10: Math.max(left(0.1), 0),
    p50: Math.max(left(0.5), 0),
    p90: Math.max(left(0.9), 0),
  };
  const doubted = doubtedReadings(readings, posterior);
  const shareUsed = lubeKmUsed / lifeQuantile(life, 0.5);
  const chancePast = posterior.chancePast(usage.wearKm, limitPct);
  const state: DueState = {
    lubrication,
    replacement,
    forecast,
    perKm,
    usage,
    treatment,
    shareUsed,
    chancePast,
    doubted,
    doubtfulArrival: doubtfulArrival(history, looks, fleet.life),
  };
  return {
    wearKm: usage.wearKm,
    totalKm: usage.totalKm,
    unloggedKm: usage.unloggedKm,
    lubrication,
    replacement,
    treatment: {
      lubeKmUsed,
      life: { p10: lifeQuantile(life, 0.1), p50: lifeQuantile(life, 0.5), p90: lifeQuantile(life, 0.9) },
      shareUsed,
      since: treatment.since,
      kind: treatment.given,
    },
    elongation: {
      now: posterior.elongationAt(usage.wearKm),
      rate: posterior.rate,
      wearKmLeft,
      chancePast,
      curve: elongationCurve(history, usage, posterior, wearKmLeft.p90, forecast, perKm.wear),
      doubted,
    },
    kmPerWeek: forecast.kmPerWeek,
    reasons: whyMoved(history, fleet.factors, state),
    alerts: chainAlerts(history, state),
    narrows: narrowing(posterior, usage.wearKm, limitPct, ['three-point']),
  };
}
