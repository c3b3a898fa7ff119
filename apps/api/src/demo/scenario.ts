import { dayOf } from '@halfpitch/estimation';
import { defaultSettings } from '../workshop/default-settings';
import type { Workshop } from '../workshop/workshop.entity';
import { makeHousehold } from './household';
import { Place, PLACES } from './places';
import { Random, seedFor } from './random';
import type { Household } from './records';
import { chainsOfBikes, shareOut } from './share-out';
import { DayWeather, townWeather } from './weather';

export interface ScenarioOptions {
  seed: number;
  /** YYYY-MM-DD; the last rides are yesterday's. */
  today: string;
  /** One or two: the second is a fifth the size of both. */
  workshops: 1 | 2;
  riders: number;
  bikes: number;
  /** Chains in service today; those retired on the way come on top. */
  chains: number;
  years: number;
}

export interface WorkshopScenario {
  seed: number;
  workshop: Workshop;
  place: Place;
  weather: readonly DayWeather[];
  /** Each rider's household, made when asked for: a large scenario never stands in memory whole. */
  households(): Generator<Household>;
}

export interface Scenario {
  today: string;
  workshops: WorkshopScenario[];
}

/** What npm start shows. */
export const DEMO_SIZE = { seed: 12_700, workshops: 2, riders: 40, bikes: 60, chains: 90, years: 2 } as const;

function workshopScenario(
  options: ScenarioOptions,
  n: number,
  size: Record<'riders' | 'bikes' | 'chains', number>,
) {
  const place = PLACES[n] ?? PLACES[0];
  const today = dayOf(options.today);
  const from = today - Math.round(options.years * 365.25);
  const ownSeed = seedFor(options.seed, n);
  const random = new Random(ownSeed);
  const { name, town, timeZone, currency } = place;
  const workshop = { id: random.id(from), name, town, timeZone, currency, settings: defaultSettings() };
  const weather = townWeather(random, from, today);
  const bikesOf = shareOut(size.bikes, size.riders);
  const chainsOf = chainsOfBikes(size.chains, size.bikes);

  function* households(): Generator<Household> {
    let next = 0;
    for (const [index, bikes] of bikesOf.entries()) {
      const seed = seedFor(ownSeed, index);
      const own = { nameIndex: index + 400 * n, chainsOfBikes: chainsOf.slice(next, (next += bikes)) };
      yield makeHousehold({ seed, index, workshopId: workshop.id, place, from, today, weather, ...own });
    }
  }
  const whole = { ...workshop, fleetModel: null, estimatedOn: null };
  return { seed: ownSeed, workshop: whole, place, weather, households };
}

/** An invented town's workshops, riders and years, up to today. Pure: the same options give the same rows, ids included. */
export function generateScenario(options: ScenarioOptions): Scenario {
  const { riders, bikes, chains, workshops, today } = options;
  if (riders > bikes || bikes > chains)
    throw new Error('Each rider has a bike and each bike a chain, at least.');
  const second = workshops === 2 ? 0.2 : 0;
  const small = {
    riders: Math.floor(riders * second),
    bikes: Math.floor(bikes * second),
    chains: Math.floor(chains * second),
  };
  const main = { riders: riders - small.riders, bikes: bikes - small.bikes, chains: chains - small.chains };
  const sizes = workshops === 2 ? [main, small] : [main];
  return { today, workshops: sizes.map((size, n) => workshopScenario(options, n, size)) };
}
