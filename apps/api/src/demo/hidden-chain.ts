import type { ArrivalCondition, Regime, TreatmentKind } from '@halfpitch/contracts';
import { defaultFleetModel, Factor } from '@halfpitch/estimation';
import { Random } from './random';

const { life, elongation } = defaultFleetModel();
type LivingKind = Exclude<TreatmentKind, 'new-chain'>;

/** What a chain of each regime is treated with. */
export const ORDINARY: Record<Regime, LivingKind> = {
  'immersion-wax': 're-wax',
  'drip-wax': 'drip-top-up',
  'wet-oil': 'oil-wet',
  'dry-oil': 'oil-dry',
};

/** This town's roads wear chains faster than the trade's median, within the spread of the prior: its own chains teach it. */
export const TOWN_WEAR = 1.4;

/** A chain as it truly is; rates and lives are drawn from the distributions that estimation starts from. */
export class HiddenChain {
  totalKm = 0;
  wearKm = 0;
  lubeKm = 0;
  life = 1;
  treatedOn = 0;
  treatments = 0;
  measuredAtKm = 0;
  readonly ratePct: number;
  private readonly runInPct: number;

  constructor(
    readonly id: string,
    readonly regime: Regime,
    private readonly random: Random,
    private readonly riderEffect: number,
    rateFactor: number,
  ) {
    const { median, logSd } = elongation.rate[regime].road;
    this.ratePct = random.logNormal(median * TOWN_WEAR, logSd) * rateFactor;
    this.runInPct = Math.max(0.03 + 0.015 * random.normal(), 0);
  }

  /** True elongation, %: quick while it runs in, then even. */
  get elongationPct(): number {
    return this.runInPct * (1 - Math.exp(-this.wearKm / 150)) + (this.ratePct * this.wearKm) / 1000;
  }

  ride(km: number, factor: Factor): void {
    this.totalKm += km;
    this.wearKm += km * factor.wear;
    this.lubeKm += km * factor.lube;
  }

  /** A treatment begins a new life, of a length that nobody knows. */
  treat(kind: LivingKind, day: number): void {
    this.life = this.random.logNormal(life.kinds[kind].median * Math.exp(this.riderEffect), life.logSdWithin);
    this.lubeKm = 0;
    this.treatedOn = day;
    this.treatments++;
  }

  /** What the mechanic sees: turning means that the life lies between 0.85 and 1.1 of the distance ridden. */
  arrival(): ArrivalCondition {
    if (this.random.chance(0.06)) return 'not-seen';
    if (this.life > 1.1 * this.lubeKm) return 'quiet';
    return this.life < 0.85 * this.lubeKm ? 'dry' : 'turning';
  }
}
