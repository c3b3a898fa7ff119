import type {
  ArrivalCondition,
  BikeKind,
  BrakeFluid,
  ReadingMethod,
  Regime,
  RetiredReason,
  Surface,
  TreatmentKind,
  Weather,
} from '@halfpitch/contracts';

/** The trade's lists in words, as every screen writes them. */
export const surfaceWords: Record<Surface, string> = {
  road: 'Road',
  gravel: 'Gravel',
  mountain: 'Mountain',
  indoor: 'Indoor',
};

export const weatherWords: Record<Weather, string> = {
  dry: 'Dry',
  damp: 'Damp',
  wet: 'Wet',
  mud: 'Mud',
  unknown: 'Not sure',
};

export const bikeKindWords: Record<BikeKind, string> = {
  road: 'Road',
  gravel: 'Gravel',
  mountain: 'Mountain',
  commuter: 'Commuter',
  cargo: 'Cargo',
  'e-bike': 'E-bike',
  trainer: 'Trainer',
};

export const brakeFluidWords: Record<BrakeFluid, string> = {
  none: 'None: rim, cable or coaster brake',
  mineral: 'Mineral oil',
  'dot-3': 'DOT 3',
  'dot-4': 'DOT 4',
  'dot-5.1': 'DOT 5.1',
};

export const regimeWords: Record<Regime, string> = {
  'immersion-wax': 'Immersion wax',
  'drip-wax': 'Drip wax',
  'wet-oil': 'Wet oil',
  'dry-oil': 'Dry oil',
};

export const methodWords: Record<ReadingMethod, string> = {
  'steel-rule': 'Steel rule',
  'three-point': 'Three-point gauge',
  'two-point': 'Two-point gauge',
  digital: 'Digital gauge',
  'drop-in': 'Drop-in gauge',
};

export const treatmentWords: Record<TreatmentKind, string> = {
  'strip-wax': 'Strip and wax',
  're-wax': 'Re-wax',
  'drip-top-up': 'Drip top-up',
  'oil-wet': 'Clean and wet oil',
  'oil-dry': 'Clean and dry oil',
  'new-chain': 'New chain',
};

export const arrivalWords: Record<ArrivalCondition, string> = {
  quiet: 'Quiet',
  turning: 'Turning',
  dry: 'Dry',
  'not-seen': 'Not seen',
};

export const retiredWords: Record<RetiredReason, string> = {
  worn: 'Worn',
  broken: 'Broken',
  damaged: 'Damaged',
  sold: 'Sold',
  lost: 'Lost',
  other: 'Another reason',
};

/** A list of the trade as options of a select field or of tiles. */
export const optionsOf = <V extends string>(words: Record<V, string>): { value: V; label: string }[] =>
  (Object.keys(words) as V[]).map((value) => ({ value, label: words[value] }));
