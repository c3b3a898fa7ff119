import type {
  ArrivalCondition,
  BikeKind,
  BrakeFluid,
  ReadingMethod,
  Regime,
  Role,
  Surface,
  TreatmentKind,
  Weather,
} from '@halfpitch/contracts';

/** The trade's lists as they are written on screen. */
export const treatmentWords: Record<TreatmentKind, string> = {
  'strip-wax': 'Strip and wax',
  're-wax': 'Re-wax',
  'drip-top-up': 'Drip top-up',
  'oil-wet': 'Clean and wet oil',
  'oil-dry': 'Clean and dry oil',
  'new-chain': 'New chain',
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

export const arrivalWords: Record<ArrivalCondition, string> = {
  quiet: 'Quiet',
  turning: 'Turning',
  dry: 'Dry',
  'not-seen': 'Not seen',
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
  none: 'No fluid',
  mineral: 'Mineral oil',
  'dot-3': 'DOT 3',
  'dot-4': 'DOT 4',
  'dot-5.1': 'DOT 5.1',
};

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
  unknown: 'Not known',
};

export const roleWords: Record<Role, string> = {
  rider: 'Rider',
  mechanic: 'Mechanic',
  desk: 'Desk',
  owner: 'Owner',
};
