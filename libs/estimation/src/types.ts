/** Shapes that cross the border of the library. Days are whole days since 1970-01-01, distances km, elongation %. */

/** Whole days since 1970-01-01 in the workshop's calendar. */
export type Day = number;

export type Surface = 'road' | 'gravel' | 'mountain' | 'indoor';
export type Weather = 'dry' | 'damp' | 'wet' | 'mud' | 'unknown';
export type Regime = 'immersion-wax' | 'drip-wax' | 'wet-oil' | 'dry-oil';
export type BikeKind = 'road' | 'gravel' | 'mountain' | 'commuter' | 'cargo' | 'e-bike' | 'trainer';
export type ReadingMethod = 'steel-rule' | 'three-point' | 'two-point' | 'digital' | 'drop-in';
export type TreatmentKind = 'strip-wax' | 're-wax' | 'drip-top-up' | 'oil-wet' | 'oil-dry' | 'new-chain';
export type ArrivalCondition = 'quiet' | 'turning' | 'dry' | 'not-seen';

/** How many km on a clean, dry road one km counts for. */
export interface Factor {
  lube: number;
  wear: number;
}

export interface Factors {
  surface: Record<Surface, Factor>;
  weather: Record<Exclude<Weather, 'unknown'>, Factor>;
  /** Share of wet days by month, January first, 0 to 1: stands in for unknown weather. */
  wetShareByMonth: readonly number[];
}

export interface Ride {
  day: Day;
  km: number;
  surface: Surface;
  weather: Weather;
}

/** A predictive distribution by three of its levels. */
export interface Band {
  p10: number;
  p50: number;
  p90: number;
}

/** One chain-checker reading; a number reading has value, a go/no-go reading lower and/or upper (% elongation). */
export interface Reading {
  id: string;
  day: Day;
  method: ReadingMethod;
  /** The same gauge on the same chain shares one offset; readings without a gauge share their method's. */
  gauge?: string;
  /** % elongation at each place measured; the worst place rules. */
  values?: readonly number[];
  /** Elongation is known to be above this, %. */
  lower?: number;
  /** Elongation is known to be below this, %. */
  upper?: number;
  /** Taken on the new chain before its first km: pins down the gauge's offset. */
  baseline?: boolean;
}

export interface Treatment {
  id: string;
  day: Day;
  kind: TreatmentKind;
  /** What the mechanic saw of the treatment before this one. */
  arrival: ArrivalCondition;
}

/** Riding that is announced: extra km on the days from..to, both included, spread evenly. */
export interface PlannedRiding {
  from: Day;
  to: Day;
  km: number;
}

/** The odometer of the bike the chain is on; km that the log lacks between two checkpoints count as unlogged. */
export interface Checkpoint {
  day: Day;
  odometerKm: number;
}

/** Everything known of one chain. Ascending order by day is not required. */
export interface ChainHistory {
  today: Day;
  bikeKind: BikeKind;
  regime: Regime;
  /** Elongation at which the chain must be replaced, %. */
  limitPct: number;
  inServiceOn: Day;
  /** Rides on this chain. */
  rides: readonly Ride[];
  /** All riding of the bike the chain is fitted to, whichever chain it was on: what the forecast learns from. */
  bikeRides: readonly Ride[];
  /** True while fitted: riding ahead counts. A chain in the box waits, its lubrication window is null. */
  fitted: boolean;
  /** Share of the bike's riding ahead that this chain will carry until replaced (1 without rotation). */
  shareOfRiding: number;
  readings: readonly Reading[];
  treatments: readonly Treatment[];
  planned: readonly PlannedRiding[];
  checkpoints: readonly Checkpoint[];
  /** Chain-day limits, days after a treatment, by regime; null when the workshop sets none. */
  calendarLimitDays: Record<Regime, number | null>;
  /** The window told last time, to explain what moved it. */
  previous?: PreviousEstimate;
}

export interface PreviousEstimate {
  day: Day;
  lubricationP50: Day | null;
  replacementP50: Day | null;
}

/** A window in days; null = not within the horizon of two years. */
export interface DueWindow {
  p10: Day | null;
  p50: Day | null;
  p90: Day | null;
  chanceWithin7: number;
  chanceWithin14: number;
  chanceWithin30: number;
  /** Chance that it is due already. */
  chanceNow: number;
  /** Chance that the (first) due day falls in week w from today, w = 0..25. */
  weeklyChance: readonly number[];
  /** Lubrication: chance that a treatment given today falls due in week w from today, for renewals ahead. */
  renewal?: readonly number[];
  /** What decides: the distance, or the calendar limit. */
  decidedBy: 'distance' | 'calendar';
}

export type ReasonCode =
  | 'riding-more'
  | 'riding-less'
  | 'wet-rides'
  | 'rough-rides'
  | 'reading'
  | 'treatment'
  | 'planned-riding'
  | 'unlogged-distance'
  | 'quiet-log'
  | 'calendar-limit'
  | 'first-estimate'
  | 'new-chain';

/** Why a window moved since the last estimate; negative days = earlier. The product puts it into words. */
export interface Reason {
  code: ReasonCode;
  about: 'lubrication' | 'replacement';
  days: number;
  /** Numbers the sentence needs, such as { rides: 2, km: 74 }. */
  data: Record<string, number>;
}

export type AlertCode =
  'wet-ride-rust' | 'quiet-log' | 'past-limit' | 'doubted-reading' | 'doubted-arrival' | 'treatment-spent';

export interface Alert {
  code: AlertCode;
  day: Day;
  data: Record<string, number | string>;
}

/** A point of the elongation chart. */
export interface ElongationPoint extends Band {
  day: Day;
  wearKm: number;
}

export interface ElongationState {
  now: Band;
  /** % per 1,000 wear km. */
  rate: Band;
  wearKmLeft: Band;
  /** Chance that the chain is already past its limit. */
  chancePast: number;
  /** From first ride to the replacement horizon, at most 80 points. */
  curve: readonly ElongationPoint[];
  doubted: readonly { readingId: string; because: string }[];
}

export interface TreatmentState {
  /** Lube km since the last treatment. */
  lubeKmUsed: number;
  /** Life of this treatment, lube km. */
  life: Band;
  /** lubeKmUsed / median life. */
  shareUsed: number;
  since: Day;
  kind: TreatmentKind;
}

export interface ChainEstimate {
  wearKm: number;
  totalKm: number;
  unloggedKm: number;
  /** Null when the chain is in the box. */
  lubrication: DueWindow | null;
  replacement: DueWindow;
  treatment: TreatmentState;
  elongation: ElongationState;
  /** Km a week expected over the next four weeks. */
  kmPerWeek: Band;
  reasons: readonly Reason[];
  alerts: readonly Alert[];
  /** What would narrow the replacement window most, if anything would: the method and the factor by which it shrinks. */
  narrows: { method: ReadingMethod; factor: number } | null;
}

/** What the fleet has taught: plain JSON, stored per workshop, refitted by a scheduled task. */
export interface FleetModel {
  version: string;
  factors: Factors;
  elongation: ElongationPriors;
  life: LifeModel;
  riding: RidingModel;
}

/** Prior of log rate by regime x kind of riding: median % per 1,000 wear km and sd of the log. */
export interface ElongationPriors {
  rate: Record<Regime, Record<BikeKind, { median: number; logSd: number; chains: number }>>;
}

/** Median life of a treatment, lube km, by so many looks on arrival; the standard error of its log where learned. */
export interface LifeOfKind {
  median: number;
  observations: number;
  logSe?: number;
}

/** Log-normal life in lube km by treatment kind; sd within a rider's cycles and between riders. */
export interface LifeModel {
  kinds: Record<Exclude<TreatmentKind, 'new-chain'>, LifeOfKind>;
  logSdWithin: number;
  logSdBetween: number;
}

/** Coefficients of the riding forecast; see riding/. */
export interface RidingModel {
  version: string;
  [key: string]: unknown;
}

/** Levels at which the riding forecast is given. */
export const LEVELS = [0.05, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.95] as const;

/** Future riding of one bike or chain, as the days it takes. */
export interface RidingForecast {
  /** Days from the origin until `km` more km are ridden, at each of LEVELS, ascending, at most the horizon (731). */
  daysToReach(km: number): readonly number[];
  /** Km a week over the next four weeks. */
  kmPerWeek: Band;
  /** The log has gone quiet: days since the last ride is beyond this rider's habit. */
  quiet: boolean;
}
