import type { Regime, RetiredReason } from '@halfpitch/contracts';
import { defaultFactors, defaultWearLimitPct } from '@halfpitch/estimation';
import type { BikeRecords } from './bike-records';
import type { RiddenRide } from './day-of-riding';
import { HiddenChain, ORDINARY } from './hidden-chain';
import type { Measuring } from './measuring';
import { Random } from './random';
import type { Special, Traits } from './rider-traits';

export interface Story {
  random: Random;
  records: BikeRecords;
  measuring: Measuring;
  traits: Traits;
  special: Special | null;
  mechanics: readonly string[];
  regime: Regime;
  /** Chains that take turns on the bike. */
  rotation: number;
  today: number;
  /** A chain that does not live to be worn out, and why. */
  mishap: { day: number; because: RetiredReason } | null;
}

/** What befalls one bike's chains: ridden, brought in, measured, treated, swapped, replaced. */
export class BikeStory {
  private readonly chains: HiddenChain[] = [];
  private turn = 0;
  private comesAt = 1;
  private lastRide = 0;
  private mishapDone = false;

  constructor(
    private readonly story: Story,
    private readonly start: number,
  ) {
    for (let i = 0; i < story.rotation; i++) this.chains.push(this.newChain(start));
    story.records.fit(this.fitted.id, start);
    this.begin();
  }

  get fitted(): HiddenChain {
    const chain = this.chains[this.turn];
    if (!chain) throw new Error('A bike of the scenario always has a chain.');
    return chain;
  }

  ride(day: number, ride: RiddenRide): void {
    const { random, traits, special, records, today } = this.story;
    const surface = defaultFactors.surface[ride.surface];
    const weather = defaultFactors.weather[ride.truly];
    const factor = { lube: surface.lube * weather.lube, wear: surface.wear * weather.wear };
    this.fitted.ride(ride.distanceM / 1000, factor);
    const silent = special === 'quiet-log' && day > today - 45;
    records.ride(this.fitted.id, day, ride, !silent && random.chance(traits.logs));
    this.lastRide = day;
  }

  /** The morning of a day on which the workshop is open. */
  morning(day: number): void {
    const { special, mishap, today } = this.story;
    if (day - this.lastRide > 14 || this.fitted.lubeKm === 0) return;
    if (special === 'overdue' && day > today - 75) return;
    if (mishap && !this.mishapDone && day >= mishap.day) return this.meetMishap(day, mishap.because);
    const { regime, treatedOn, lubeKm } = this.fitted;
    const oilIsOld = regime.endsWith('oil') && lubeKm > 60 && day - treatedOn > 31 + (day % 23);
    const asked = special === 'just-treated' && day >= today - 3;
    if (lubeKm >= this.comesAt || oilIsOld || (asked && day - treatedOn > 6)) this.visit(day);
  }

  private visit(day: number): void {
    const { random, records, traits, measuring, special } = this.story;
    const chain = this.fitted;
    if (traits.hasOdometer && random.chance(0.4)) records.odometer(day);
    let worn = false;
    if (chain.totalKm - chain.measuredAtKm > 350 && random.chance(0.7)) {
      chain.measuredAtKm = chain.totalKm;
      worn = measuring.take(chain, day) >= defaultWearLimitPct(records.bike.speeds);
      if (special === 'contradiction' && chain.elongationPct > 0.2) measuring.contradict(chain, day);
    }
    if (worn && special !== 'keeps-worn-chain' && random.chance(0.8)) this.replace(day, 'worn');
    else this.treat(chain, day);
    this.swap(day);
    this.begin();
  }

  private meetMishap(day: number, because: RetiredReason): void {
    this.mishapDone = true;
    this.replace(day, because);
    this.begin();
  }

  /** The chain is retired; a new one takes its place, on the bike at once. */
  private replace(day: number, because: RetiredReason): void {
    const { records } = this.story;
    records.takeOff(this.fitted.id, day);
    records.retire(this.fitted.id, day, because);
    this.tellTruth(this.fitted);
    this.chains[this.turn] = this.newChain(day);
    records.fit(this.fitted.id, day);
  }

  private swap(day: number): void {
    if (this.chains.length === 1 || this.fitted.treatments === 0 || this.fitted.totalKm === 0) return;
    const { records } = this.story;
    records.takeOff(this.fitted.id, day);
    this.turn = (this.turn + 1) % this.chains.length;
    records.fit(this.fitted.id, day);
  }

  private newChain(day: number): HiddenChain {
    const { random, records, regime, traits, special, measuring } = this.story;
    const { id } = records.addChain(regime, day);
    const chain = new HiddenChain(
      id,
      regime,
      random,
      traits.roadEffect,
      special === 'keeps-worn-chain' ? 3 : 1,
    );
    if (random.chance(0.5)) measuring.take(chain, day, true);
    const wax = regime === 'immersion-wax';
    const mechanic = random.pick(this.story.mechanics);
    const notes = wax ? 'New chain, stripped of its factory grease.' : '';
    const kind = wax ? 'strip-wax' : 'new-chain';
    records.treat(chain, day, { kind, arrival: 'not-seen', byName: mechanic, notes });
    chain.treat(wax ? 'strip-wax' : ORDINARY[regime], day);
    return chain;
  }

  private treat(chain: HiddenChain, day: number): void {
    const { random, records, regime } = this.story;
    const wax = regime === 'immersion-wax';
    const strip = wax && chain.treatments % 7 === 0;
    const topUp = wax && !strip && random.chance(0.08);
    const kind = strip ? 'strip-wax' : topUp ? 'drip-top-up' : ORDINARY[regime];
    const arrival = chain.arrival();
    const notes = arrival === 'dry' && random.chance(0.25) ? 'Rust on the outer plates.' : '';
    records.treat(chain, day, { kind, arrival, byName: random.pick(this.story.mechanics), notes });
    chain.treat(kind, day);
  }

  private begin(): void {
    const { random, traits } = this.story;
    this.comesAt = this.fitted.life * random.logNormal(traits.comesAt, 0.22);
  }

  /** Ends the story today: what the chains in service are truly like. */
  end(): void {
    this.chains.forEach((chain) => this.tellTruth(chain));
  }

  private tellTruth({ id, ratePct, elongationPct, totalKm, wearKm }: HiddenChain): void {
    this.story.records.household.truth.chains.push({ chainId: id, ratePct, elongationPct, totalKm, wearKm });
  }
}
