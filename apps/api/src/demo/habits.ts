import type { BikeKind, BrakeFluid, Regime, Surface } from '@halfpitch/contracts';

/** How one bike is ridden. Figures are our judgement of ordinary riders: common practice, no source. */
export interface Habit {
  kind: BikeKind;
  names: readonly string[];
  speeds: readonly number[];
  brakes: readonly BrakeFluid[];
  /** Lubricant of a bike with one chain; where chains rotate it is always immersion wax. */
  regimes: Partial<Record<Regime, number>>;
  /** Chance of riding on Monday … Sunday, in the best month. */
  week: readonly number[];
  /** Share of that by month, January first. */
  season: readonly number[];
  /** Rides a day, there and back. */
  legs: 1 | 2;
  /** Median km of a ride on working days and at weekends. */
  km: readonly [number, number];
  /** Spread (log sd) of one rider's rides. */
  spread: number;
  kmh: number;
  surfaces: Partial<Record<Surface, number>>;
  /** Share of rides that rain prevents. */
  staysHome: number;
}

const workdays = (p: number, weekend = 0) => [p, p, p, p, p * 0.85, weekend, weekend];
const ALL_YEAR = [0.85, 0.85, 0.92, 0.97, 1, 1, 0.9, 0.8, 1, 0.97, 0.9, 0.7];
const SUMMER = [0.08, 0.12, 0.35, 0.65, 0.9, 1, 1, 0.95, 0.8, 0.45, 0.15, 0.06];
const SPORT = [0.55, 0.6, 0.8, 0.95, 1, 1, 0.95, 0.95, 0.9, 0.75, 0.6, 0.5];
const WINTER = [1, 0.95, 0.6, 0.15, 0, 0, 0, 0, 0.05, 0.3, 0.8, 1];

export const habits = {
  commuter: {
    kind: 'commuter',
    names: ['Green town bike', 'Work bike', 'Grey hub-gear', 'Old steel bike', 'Station bike'],
    speeds: [8, 9, 10],
    brakes: ['mineral', 'none'],
    regimes: { 'wet-oil': 0.45, 'dry-oil': 0.2, 'drip-wax': 0.35 },
    week: workdays(0.66, 0.15),
    season: ALL_YEAR,
    legs: 2,
    km: [6.5, 5],
    spread: 0.08,
    kmh: 18,
    surfaces: { road: 0.94, gravel: 0.06 },
    staysHome: 0.25,
  },
  weekend: {
    kind: 'road',
    names: ['Blue road bike', 'Summer bike', 'Titanium road bike', 'Red road bike'],
    speeds: [10, 11],
    brakes: ['none', 'mineral'],
    regimes: { 'drip-wax': 0.6, 'immersion-wax': 0.2, 'dry-oil': 0.2 },
    week: [0.04, 0.1, 0.2, 0.1, 0.08, 0.5, 0.55],
    season: SUMMER,
    legs: 1,
    km: [26, 48],
    spread: 0.3,
    kmh: 23,
    surfaces: { road: 0.97, gravel: 0.03 },
    staysHome: 0.8,
  },
  racer: {
    kind: 'road',
    names: ['Race bike', 'Training bike', 'Carbon race bike'],
    speeds: [11, 12],
    brakes: ['mineral', 'dot-5.1'],
    regimes: { 'immersion-wax': 0.75, 'drip-wax': 0.25 },
    week: [0.12, 0.55, 0.35, 0.55, 0.2, 0.65, 0.65],
    season: SPORT,
    legs: 1,
    km: [38, 72],
    spread: 0.28,
    kmh: 28,
    surfaces: { road: 1 },
    staysHome: 0.55,
  },
  gravel: {
    kind: 'gravel',
    names: ['Gravel bike', 'Forest-road bike', 'Sand-coloured gravel bike'],
    speeds: [11, 12],
    brakes: ['mineral', 'dot-5.1', 'dot-4'],
    regimes: { 'immersion-wax': 0.5, 'drip-wax': 0.5 },
    week: [0.06, 0.18, 0.25, 0.18, 0.1, 0.42, 0.45],
    season: SPORT,
    legs: 1,
    km: [24, 41],
    spread: 0.32,
    kmh: 20,
    surfaces: { gravel: 0.62, road: 0.36, mountain: 0.02 },
    staysHome: 0.4,
  },
  mountain: {
    kind: 'mountain',
    names: ['Hardtail', 'Trail bike', 'Full-suspension bike'],
    speeds: [11, 12],
    brakes: ['dot-5.1', 'mineral', 'dot-3'],
    regimes: { 'wet-oil': 0.4, 'drip-wax': 0.6 },
    week: [0.03, 0.08, 0.22, 0.1, 0.05, 0.35, 0.5],
    season: SPORT,
    legs: 1,
    km: [14, 23],
    spread: 0.3,
    kmh: 13,
    surfaces: { mountain: 0.72, gravel: 0.22, road: 0.06 },
    staysHome: 0.3,
  },
  cargo: {
    kind: 'cargo',
    names: ['Family cargo bike', 'Long cargo bike', 'Delivery bike'],
    speeds: [8, 9],
    brakes: ['mineral'],
    regimes: { 'wet-oil': 0.7, 'drip-wax': 0.3 },
    week: workdays(0.68, 0.35),
    season: ALL_YEAR,
    legs: 2,
    km: [3.8, 5],
    spread: 0.2,
    kmh: 15,
    surfaces: { road: 0.93, gravel: 0.07 },
    staysHome: 0.18,
  },
  'e-bike': {
    kind: 'e-bike',
    names: ['E-bike', 'Touring e-bike', 'Step-through e-bike'],
    speeds: [9, 10, 11],
    brakes: ['mineral', 'dot-4'],
    regimes: { 'wet-oil': 0.4, 'drip-wax': 0.4, 'dry-oil': 0.2 },
    week: workdays(0.52, 0.3),
    season: ALL_YEAR,
    legs: 2,
    km: [9.5, 12],
    spread: 0.15,
    kmh: 22,
    surfaces: { road: 0.88, gravel: 0.12 },
    staysHome: 0.35,
  },
  trainer: {
    kind: 'trainer',
    names: ['Trainer bike', 'Bike in the cellar'],
    speeds: [10, 11],
    brakes: ['none'],
    regimes: { 'drip-wax': 0.6, 'dry-oil': 0.4 },
    week: [0.35, 0.5, 0.35, 0.5, 0.15, 0.2, 0.25],
    season: WINTER,
    legs: 1,
    km: [26, 36],
    spread: 0.22,
    kmh: 31,
    surfaces: { indoor: 1 },
    staysHome: 0,
  },
} as const satisfies Record<string, Habit>;

export type HabitName = keyof typeof habits;

/** The bikes riders of each sort own, in the order they bought them. */
export const RIDER_SORTS: readonly (readonly HabitName[])[] = [
  ['commuter', 'weekend', 'mountain'],
  ['racer', 'trainer', 'commuter'],
  ['gravel', 'commuter', 'racer'],
  ['e-bike', 'cargo', 'weekend'],
  ['weekend', 'commuter', 'gravel'],
  ['commuter', 'gravel', 'weekend'],
  ['cargo', 'e-bike', 'weekend'],
  ['mountain', 'commuter', 'gravel'],
  ['racer', 'gravel', 'trainer'],
  ['e-bike', 'mountain', 'cargo'],
];
