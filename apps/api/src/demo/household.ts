import { retiredReasons } from '@halfpitch/contracts';
import type { Bike } from '../bikes/bike.entity';
import { BikeRecords } from './bike-records';
import { BikeStory } from './bike-story';
import { ridesOfDay } from './day-of-riding';
import { Habit, HabitName, habits, RIDER_SORTS } from './habits';
import { Measuring } from './measuring';
import { addressOf, Place, riderName } from './places';
import { Random } from './random';
import type { Household } from './records';
import { drawTraits, specialOf } from './rider-traits';
import type { DayWeather } from './weather';

export interface HouseholdPlan {
  seed: number;
  /** The rider's place in the workshop's list. */
  index: number;
  workshopId: string;
  place: Place;
  /** The rider's place among all workshops' names. */
  nameIndex: number;
  /** Days from the first of the scenario to today. */
  from: number;
  today: number;
  weather: readonly DayWeather[];
  /** Chains on each of the rider's bikes. */
  chainsOfBikes: readonly number[];
}

function newHousehold(
  random: Random,
  { index, nameIndex, workshopId, place, from }: HouseholdPlan,
): Household {
  const name = riderName(nameIndex);
  const rider = {
    id: random.id(from),
    workshopId,
    name,
    email: addressOf(name, place),
    phone: random.chance(0.6) ? `+00 555 ${String(1000 + index).padStart(5, '0')}` : '',
    notes: random.pick([
      '',
      '',
      '',
      'Prefers Saturday mornings.',
      'Rings before coming.',
      'Leaves the bike at the gate.',
    ]),
    distanceUnit: random.chance(0.25) ? ('mi' as const) : ('km' as const),
    remindersOn: !random.chance(0.06),
    stopToken: Array.from({ length: 32 }, () => random.int(0, 35).toString(36)).join(''),
  };
  const nothing = {
    bikes: [],
    chains: [],
    fittings: [],
    odometer: [],
    rides: [],
    readings: [],
    treatments: [],
  };
  return { index, rider, ...nothing, truth: { chains: [], readings: [] } };
}

function newBike(random: Random, household: Household, habit: Habit, from: number): Bike {
  const { id: riderId, workshopId } = household.rider;
  const taken = household.bikes.map(({ name }) => name);
  const names = habit.names.filter((name) => !taken.includes(name));
  const bike: Bike = {
    id: random.id(from),
    workshopId,
    riderId,
    name: random.pick(names),
    kind: habit.kind,
    speeds: random.pick(habit.speeds),
    brakeFluid: random.pick(habit.brakes),
    notes: '',
  };
  household.bikes.push(bike);
  return bike;
}

/** One rider's years, day by day: the same plan always gives the same household. */
export function makeHousehold(plan: HouseholdPlan): Household {
  const random = new Random(plan.seed);
  const special = specialOf(plan.index);
  const late = special === 'two-weeks' || special === 'no-rides';
  const from = late ? plan.today - 14 : plan.from + random.int(0, 40);
  const household = newHousehold(random, plan);
  const traits = drawTraits(random, plan.from, plan.today);
  const measuring = new Measuring(random, household, random.pick(plan.place.mechanics));
  const sort: readonly HabitName[] = RIDER_SORTS[plan.index % RIDER_SORTS.length] ?? ['commuter'];

  plan.chainsOfBikes.forEach((rotation, n) => {
    const habit: Habit = habits[sort[n % sort.length] ?? 'commuter'];
    const records = new BikeRecords(random, household, newBike(random, household, habit, from), traits);
    const because = retiredReasons[1 + (Math.floor(plan.index / 4) % (retiredReasons.length - 1))] ?? 'other';
    const mishap =
      plan.index % 4 === 3 && n === 0 ? { day: plan.today - random.int(60, 400), because } : null;
    const regime = rotation > 1 ? 'immersion-wax' : random.weighted(habit.regimes);
    const { mechanics } = plan.place;
    const story = new BikeStory(
      { random, records, measuring, traits, special, mechanics, regime, rotation, mishap, today: plan.today },
      from,
    );
    if (special !== 'no-rides') rideOn(random, plan, from, habit, traits, story);
    story.end();
  });
  return household;
}

/** Every day to yesterday: today's rides are still to come. */
function rideOn(
  random: Random,
  plan: HouseholdPlan,
  from: number,
  habit: Habit,
  traits: ReturnType<typeof drawTraits>,
  story: BikeStory,
): void {
  let mood = 0;
  for (let day = from; day < plan.today; day++) {
    const weather = plan.weather[day - plan.from];
    if (!weather) throw new Error('The weather of the scenario ends before its days do.');
    if (weather.weekday === 0) mood = 0.85 * mood + 0.16 * random.normal();
    if (weather.weekday < 6) story.morning(day);
    if (traits.away.some(([first, last]) => day >= first && day <= last)) continue;
    for (const ride of ridesOfDay(random, habit, traits, weather, mood)) story.ride(day, ride);
  }
}
