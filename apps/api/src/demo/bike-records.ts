import type { BikeKind, Regime, RetiredReason } from '@halfpitch/contracts';
import { rideFingerprint } from '@halfpitch/ride-files';
import type { Bike } from '../bikes/bike.entity';
import type { Chain } from '../chains/chain.entity';
import type { Fitting } from '../chains/fitting.entity';
import { isoDay } from '@halfpitch/estimation';
import type { Treatment } from '../treatments/treatment.entity';
import type { RiddenRide } from './day-of-riding';
import type { HiddenChain } from './hidden-chain';
import { Random } from './random';
import type { Household } from './records';
import type { Traits } from './rider-traits';

/** What the workshop writes on the tag of a chain, before its letter. */
const LABELS: Record<BikeKind, string> = {
  road: 'Road',
  gravel: 'Gravel',
  mountain: 'Trail',
  commuter: 'Town',
  cargo: 'Cargo',
  'e-bike': 'Assist',
  trainer: 'Indoor',
};

/** Puts what happens to one bike into the rows of its household. */
export class BikeRecords {
  private odometerM: number;
  private readonly open = new Map<string, Fitting>();

  constructor(
    private readonly random: Random,
    readonly household: Household,
    readonly bike: Bike,
    private readonly traits: Traits,
  ) {
    this.odometerM = random.chance(0.5) ? 0 : random.int(400, 9000) * 1000;
  }

  private get owned() {
    return { workshopId: this.bike.workshopId };
  }

  addChain(regime: Regime, day: number): Chain {
    const n = this.household.chains.length;
    const chain: Chain = {
      ...this.owned,
      id: this.random.id(day),
      riderId: this.bike.riderId,
      label: `${LABELS[this.bike.kind]} ${String.fromCharCode(65 + (n % 26))}${Math.floor(n / 26) || ''}`,
      speeds: this.bike.speeds,
      regime,
      wearLimitPct: null,
      inServiceOn: isoDay(day),
      retiredOn: null,
      retiredBecause: null,
    };
    this.household.chains.push(chain);
    return chain;
  }

  fit(chainId: string, day: number): void {
    const fromDay = isoDay(day);
    const fitting = {
      ...this.owned,
      id: this.random.id(day),
      chainId,
      bikeId: this.bike.id,
      fromDay,
      toDay: null,
    };
    this.open.set(chainId, fitting);
    this.household.fittings.push(fitting);
  }

  /** The chain comes off in the morning of `day`: the day before was its last on the bike. */
  takeOff(chainId: string, day: number): void {
    const fitting = this.open.get(chainId);
    if (!fitting) throw new Error('A chain that is on no bike cannot come off.');
    fitting.toDay = isoDay(day - 1);
    this.open.delete(chainId);
  }

  retire(chainId: string, day: number, because: RetiredReason): void {
    const chain = this.household.chains.find(({ id }) => id === chainId);
    if (chain) Object.assign(chain, { retiredOn: isoDay(day), retiredBecause: because });
  }

  /** Logs the ride, where it reaches the log; the odometer counts it all the same. */
  ride(chainId: string, day: number, ride: RiddenRide, logged: boolean): void {
    this.odometerM += ride.distanceM;
    if (!logged) return;
    const { device } = this.traits;
    const date = isoDay(day);
    const id = this.random.id(day);
    const startedAt = device ? new Date(day * 86_400_000 + ride.startS * 1000) : null;
    const told = { date, startedAt: startedAt?.toISOString() ?? null, distanceM: ride.distanceM };
    // Written out, not spread: millions of these are made for a benchmark.
    this.household.rides.push({
      id,
      workshopId: this.bike.workshopId,
      bikeId: this.bike.id,
      chainId,
      day: date,
      startedAt,
      distanceM: ride.distanceM,
      movingS: ride.movingS,
      surface: ride.surface,
      weather: ride.logged,
      notes: '',
      source: device ? this.random.weighted({ gpx: 0.3, fit: 0.5, tcx: 0.1, csv: 0.1 }) : 'typed',
      fingerprint: device ? rideFingerprint(told, 0) : `typed|${id}`,
    });
  }

  treat(chain: HiddenChain, day: number, of: Pick<Treatment, 'kind' | 'arrival' | 'byName' | 'notes'>): void {
    const row = { ...this.owned, id: this.random.id(day), chainId: chain.id, day: isoDay(day), ...of };
    this.household.treatments.push(row);
  }

  odometer(day: number): void {
    const row = { ...this.owned, id: this.random.id(day), bikeId: this.bike.id, day: isoDay(day) };
    this.household.odometer.push({ ...row, odometerM: this.odometerM });
  }
}
