/** The trade's own lists: the words every part of the product uses for them. */
export const surfaces = ['road', 'gravel', 'mountain', 'indoor'] as const;
export const weathers = ['dry', 'damp', 'wet', 'mud', 'unknown'] as const;
export const bikeKinds = ['road', 'gravel', 'mountain', 'commuter', 'cargo', 'e-bike', 'trainer'] as const;
export const brakeFluids = ['none', 'mineral', 'dot-3', 'dot-4', 'dot-5.1'] as const;
export const regimes = ['immersion-wax', 'drip-wax', 'wet-oil', 'dry-oil'] as const;
export const readingMethods = ['steel-rule', 'three-point', 'two-point', 'digital', 'drop-in'] as const;
export const treatmentKinds = [
  'strip-wax',
  're-wax',
  'drip-top-up',
  'oil-wet',
  'oil-dry',
  'new-chain',
] as const;
export const arrivalConditions = ['quiet', 'turning', 'dry', 'not-seen'] as const;
export const retiredReasons = ['worn', 'broken', 'damaged', 'sold', 'lost', 'other'] as const;

export type Surface = (typeof surfaces)[number];
export type Weather = (typeof weathers)[number];
export type BikeKind = (typeof bikeKinds)[number];
export type BrakeFluid = (typeof brakeFluids)[number];
export type Regime = (typeof regimes)[number];
export type ReadingMethod = (typeof readingMethods)[number];
export type TreatmentKind = (typeof treatmentKinds)[number];
export type ArrivalCondition = (typeof arrivalConditions)[number];
export type RetiredReason = (typeof retiredReasons)[number];
