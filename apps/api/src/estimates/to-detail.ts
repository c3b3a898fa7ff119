import type { Dryness, DueWindow as WireWindow } from '@halfpitch/contracts';
import { ChainEstimate, DueWindow, isoDay } from '@halfpitch/estimation';
import type { EstimateDetail } from './estimate.entity';

/** Fresh until 60 % of the treatment is used, dry beyond all of it. */
export function drynessOf(shareUsed: number): Dryness {
  if (shareUsed >= 1) return 'dry';
  return shareUsed >= 0.6 ? 'turning' : 'fresh';
}

const isoOrNull = (day: number | null) => (day === null ? null : isoDay(day));

function toWindow({ weeklyChance: _, p10, p50, p90, ...rest }: DueWindow): WireWindow {
  return { ...rest, p10: isoOrNull(p10), p50: isoOrNull(p50), p90: isoOrNull(p90) };
}

/** What is kept of an estimate and sent to whoever looks at the chain: the library's days as calendar days. */
export function toDetail(estimate: ChainEstimate): EstimateDetail {
  const { lubrication, replacement, treatment, elongation, alerts, reasons } = estimate;
  const { shareUsed, since, ...treated } = treatment;
  return {
    shareUsed,
    dryness: drynessOf(shareUsed),
    elongationPct: elongation.now.p50,
    chancePast: elongation.chancePast,
    lubrication: lubrication && toWindow(lubrication),
    replacement: toWindow(replacement),
    wearKm: estimate.wearKm,
    totalKm: estimate.totalKm,
    unloggedKm: estimate.unloggedKm,
    kmPerWeek: estimate.kmPerWeek,
    treatment: { ...treated, since: isoDay(since) },
    elongation: {
      now: elongation.now,
      rate: elongation.rate,
      wearKmLeft: elongation.wearKmLeft,
      curve: elongation.curve.map((point) => ({ ...point, day: isoDay(point.day) })),
      doubted: [...elongation.doubted],
    },
    reasons: reasons.map((reason) => ({ ...reason, data: { ...reason.data } })),
    alerts: alerts.map((alert) => ({ ...alert, day: isoDay(alert.day) })),
    narrows: estimate.narrows,
    weekly: {
      lubrication: lubrication && [...lubrication.weeklyChance],
      replacement: [...replacement.weeklyChance],
    },
  };
}
