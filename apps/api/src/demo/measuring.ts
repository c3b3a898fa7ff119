import type { ReadingMethod } from '@halfpitch/contracts';
import { isoDay } from '@halfpitch/estimation';
import { GAUGES, measure, pickGauge, Shown, worst } from './gauges';
import type { HiddenChain } from './hidden-chain';
import { Random } from './random';
import type { Household } from './records';

/** Takes readings of one rider's chains: what each gauge adds on each chain stays the same. */
export class Measuring {
  private readonly offsets = new Map<string, number>();
  private readonly usual: ReadingMethod;

  constructor(
    private readonly random: Random,
    private readonly household: Household,
    private readonly byName: string,
  ) {
    this.usual = pickGauge(random);
  }

  /** Measures and records; answers the elongation that the mechanic goes by, %. */
  take(chain: HiddenChain, day: number, baseline = false): number {
    const method = this.random.chance(0.75) ? this.usual : pickGauge(this.random);
    const offsetPct = this.offsetOf(chain.id, method);
    const shown = measure(this.random, method, chain.elongationPct, offsetPct);
    this.record(chain, day, method, shown, { baseline, contradictory: false });
    return worst(shown);
  }

  /** A reading that cannot be: a quarter of a per cent shorter than the chain is. */
  contradict(chain: HiddenChain, day: number): void {
    const shown = measure(
      this.random,
      'digital',
      chain.elongationPct - 0.25,
      this.offsetOf(chain.id, 'digital'),
    );
    this.record(chain, day, 'digital', shown, { baseline: false, contradictory: true });
  }

  private offsetOf(chainId: string, method: ReadingMethod): number {
    const key = `${chainId} ${method}`;
    const { offset, offsetSd } = GAUGES[method];
    const known = this.offsets.get(key) ?? offset + offsetSd * this.random.normal();
    this.offsets.set(key, known);
    return known;
  }

  private record(
    chain: HiddenChain,
    day: number,
    method: ReadingMethod,
    shown: Shown,
    { baseline, contradictory }: { baseline: boolean; contradictory: boolean },
  ): void {
    const { workshopId } = this.household.rider;
    const id = this.random.id(day);
    this.household.readings.push({
      id,
      workshopId,
      chainId: chain.id,
      day: isoDay(day),
      method,
      ...shown,
      baseline,
      notes: '',
      byName: this.byName,
      byAccountId: null,
    });
    this.household.truth.readings.push({
      readingId: id,
      method,
      elongationPct: chain.elongationPct,
      offsetPct: this.offsetOf(chain.id, method),
      contradictory,
    });
  }
}
