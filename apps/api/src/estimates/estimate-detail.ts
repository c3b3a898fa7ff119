import type { DueWindow } from '@halfpitch/contracts';
import { ChainEstimate, DueWindow as LibraryWindow, isoDay } from '@halfpitch/estimation';
import type { EstimateDetail } from './estimate.entity';

const dayOrNull = (day: number | null) => (day === null ? null : isoDay(day));

/** Kept figures have six significant digits: more than any of them deserves, and half the room. */
function brief(value: number): number {
  if (value === 0) return 0;
  const scale = 10 ** (5 - Math.floor(Math.log10(Math.abs(value))));
  return Number.isFinite(scale) ? Math.round(value * scale) / scale : 0;
}
/** A chance, free of what rounding adds beyond 0 and 1. */
const chance = (value: number) => brief(Math.min(Math.max(value, 0), 1));
const band = ({ p10, p50, p90 }: { p10: number; p50: number; p90: number }) => ({
  p10: brief(p10),
  p50: brief(p50),
  p90: brief(p90),
});

function toWindow(window: LibraryWindow): DueWindow {
  return {
    p10: dayOrNull(window.p10),
    p50: dayOrNull(window.p50),
    p90: dayOrNull(window.p90),
    chanceNow: chance(window.chanceNow),
    chanceWithin7: chance(window.chanceWithin7),
    chanceWithin14: chance(window.chanceWithin14),
    chanceWithin30: chance(window.chanceWithin30),
    decidedBy: window.decidedBy,
  };
}

const drynessOf = (shareUsed: number) => (shareUsed < 0.6 ? 'fresh' : shareUsed < 1 ? 'turning' : 'dry');

/** An estimate as it is kept and told: calendar days for day counts, a word for the state. */
export function toDetail(estimate: ChainEstimate): EstimateDetail {
  const { treatment, elongation, lubrication, replacement } = estimate;
  return {
    shareUsed: brief(treatment.shareUsed),
    dryness: drynessOf(treatment.shareUsed),
    elongationPct: brief(elongation.now.p50),
    chancePast: chance(elongation.chancePast),
    lubrication: lubrication && toWindow(lubrication),
    replacement: toWindow(replacement),
    wearKm: brief(estimate.wearKm),
    totalKm: brief(estimate.totalKm),
    unloggedKm: brief(estimate.unloggedKm),
    kmPerWeek: band(estimate.kmPerWeek),
    treatment: {
      kind: treatment.kind,
      since: isoDay(treatment.since),
      lubeKmUsed: brief(treatment.lubeKmUsed),
      life: band(treatment.life),
    },
    elongation: {
      now: band(elongation.now),
      rate: band(elongation.rate),
      wearKmLeft: band(elongation.wearKmLeft),
      curve: elongation.curve.map((point) => ({
        ...band(point),
        day: isoDay(point.day),
        wearKm: brief(point.wearKm),
      })),
      doubted: [...elongation.doubted],
    },
    reasons: estimate.reasons.map((reason) => ({ ...reason })),
    alerts: estimate.alerts.map((alert) => ({ ...alert, day: isoDay(alert.day) })),
    narrows: estimate.narrows,
    weekly: {
      lubrication: lubrication && lubrication.weeklyChance.map(chance),
      replacement: replacement.weeklyChance.map(chance),
      renewal: lubrication?.renewal?.map(chance),
    },
  };
}
