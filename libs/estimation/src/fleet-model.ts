import { defaultFactors } from './distance/default-factors';
import { defaultLife } from './life/default-life';
import { defaultRidingModel } from './riding';
import type { BikeKind, ElongationPriors, FleetModel, Regime } from './types';

/** Starting medians, % per 1,000 wear km. Our judgement from single riders' published figures (facts of the trade). */
const RATES: Record<Regime, number> = {
  'immersion-wax': 0.04,
  'drip-wax': 0.08,
  'wet-oil': 0.12,
  'dry-oil': 0.12,
};
const KINDS: readonly BikeKind[] = ['road', 'gravel', 'mountain', 'commuter', 'cargo', 'e-bike', 'trainer'];

function defaultElongation(): ElongationPriors {
  const forRegime = (regime: Regime) =>
    Object.fromEntries(KINDS.map((kind) => [kind, { median: RATES[regime], logSd: 0.5, chains: 0 }]));
  const regimes = Object.keys(RATES) as Regime[];
  return {
    rate: Object.fromEntries(
      regimes.map((regime) => [regime, forRegime(regime)]),
    ) as ElongationPriors['rate'],
  };
}

/** What every workshop starts from, before its own riders and chains have taught anything. */
export function defaultFleetModel(): FleetModel {
  return {
    version: 'default-1',
    factors: defaultFactors,
    elongation: defaultElongation(),
    life: defaultLife,
    riding: defaultRidingModel,
  };
}
