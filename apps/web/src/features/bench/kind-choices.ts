import { treatmentChoices } from '@halfpitch/contracts';
import type { Regime, TreatmentInput } from '@halfpitch/contracts';
import { treatmentWords } from '../../components/trade-words';

type Kind = TreatmentInput['kind'];

/** What is done to a chain of each regime, most usual first. */
const USUAL: Record<Regime, readonly Kind[]> = {
  'immersion-wax': ['re-wax', 'strip-wax', 'drip-top-up'],
  'drip-wax': ['drip-top-up', 'strip-wax'],
  'wet-oil': ['oil-wet'],
  'dry-oil': ['oil-dry'],
};

const HINTS: Record<Kind, string> = {
  're-wax': 'into the pot, no strip',
  'strip-wax': 'bare metal, then the pot',
  'drip-top-up': 'drip wax on the clean chain',
  'oil-wet': 'for rain and winter',
  'oil-dry': 'for dry roads',
};

/** Every treatment there is, the chain's own regime first. */
export function kindChoices(regime: Regime): { value: Kind; label: string; hint: string }[] {
  const usual = USUAL[regime];
  const others = treatmentChoices.options.filter((kind) => !usual.includes(kind));
  return [...usual, ...others].map((value) => ({ value, label: treatmentWords[value], hint: HINTS[value] }));
}

/** True when a treatment belongs to another regime than the chain has: its regime should be changed then. */
export const leavesRegime = (regime: Regime, kind: Kind): boolean => !USUAL[regime].includes(kind);
