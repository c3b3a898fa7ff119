import type { ChainHistory, Day, LifeModel, Regime, TreatmentKind } from '../types';
import type { Usage } from '../usage';
import { isDoubtful } from './rider-life';
import type { LifeObservation } from './rider-life';

type LivingKind = LifeObservation['kind'];

/** What a new chain comes with, by regime: it lives like that regime's ordinary treatment. */
const KIND_OF_REGIME: Record<Regime, LivingKind> = {
  'immersion-wax': 'strip-wax',
  'drip-wax': 'drip-top-up',
  'wet-oil': 'oil-wet',
  'dry-oil': 'oil-dry',
};

export interface CurrentTreatment {
  /** Whose life counts. */
  kind: LivingKind;
  /** What was recorded. */
  given: TreatmentKind;
  since: Day;
}

const living = (kind: TreatmentKind, regime: Regime): LivingKind =>
  kind === 'new-chain' ? KIND_OF_REGIME[regime] : kind;

function inOrder({ treatments, today }: ChainHistory) {
  return treatments.filter(({ day }) => day <= today).sort((a, b) => a.day - b.day);
}

/** The last treatment; a chain without any counts as new on the day it went into service. */
export function currentTreatment(history: ChainHistory): CurrentTreatment {
  const last = inOrder(history).at(-1);
  const given = last?.kind ?? 'new-chain';
  return {
    kind: living(given, history.regime),
    given,
    since: Math.min(last?.day ?? history.inServiceOn, history.today),
  };
}

/** How each earlier treatment was found when the next was given. */
export function lifeObservations(history: ChainHistory, usage: Usage): LifeObservation[] {
  const treatments = inOrder(history);
  return treatments.map((treatment, i) => {
    const before = treatments[i - 1];
    return {
      kind: living(before?.kind ?? 'new-chain', history.regime),
      lubeKm: usage.lubeKmBetween(before?.day ?? history.inServiceOn, treatment.day),
      arrival: treatment.arrival,
    };
  });
}

/** The newest look at a treatment's end, where it is more likely mistaken than true: its day and the lube km it claims. */
export function doubtfulArrival(
  history: ChainHistory,
  looks: readonly LifeObservation[],
  life: LifeModel,
): { day: Day; lubeKm: number } | null {
  const last = looks.at(-1);
  const day = inOrder(history).at(-1)?.day;
  return last && day !== undefined && isDoubtful(last, life) ? { day, lubeKm: last.lubeKm } : null;
}
