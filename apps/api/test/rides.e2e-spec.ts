import type { Bike, Chain, Ride, Rider, RidingDay, WorkshopSettings } from '@halfpitch/contracts';
import { QueueService } from '../src/jobs/queue.service';
import { BootedApp, bootApp, invited, ownerOfNewWorkshop } from './support/app';
import { Browser, daysAgo, joined, newBike, newChain, newRide, newRider } from './support/scene';

let booted: BootedApp;
let owner: Browser;
let mechanic: Browser;
let stranger: Browser;
let rider: Rider;
let browser: Browser;
let bike: Bike;
let chain: Chain;

beforeAll(async () => {
  booted = await bootApp();
  ({ browser: owner } = await ownerOfNewWorkshop(booted, 'North Wheel'));
  ({ browser: stranger } = await ownerOfNewWorkshop(booted, 'South Wheel'));
  mechanic = await invited(booted, owner, {
    name: 'Mo Mechanic',
    email: 'mo@north.example',
    role: 'mechanic',
  });
  rider = await newRider(owner, 'Rita Rider');
  browser = await joined(booted, owner, rider);
});
beforeEach(async () => {
  bike = await newBike(browser, rider.id);
  chain = await newChain(browser, bike);
});
afterAll(() => booted.close());

/** The chains of which `work` asks for a new estimate. */
async function asked(work: () => Promise<unknown>): Promise<string[]> {
  const send = jest.spyOn(booted.app.get(QueueService), 'send');
  await work();
  const chains = send.mock.calls.flatMap(([name, data]) =>
    name === 'estimate-chain' && 'chainId' in data ? [data.chainId] : [],
  );
  send.mockRestore();
  return chains.sort();
}

const input = (change = {}) => ({
  bikeId: bike.id,
  day: daysAgo(1),
  distanceM: 20_000,
  surface: 'road',
  weather: 'dry',
  ...change,
});

describe('a ride', () => {
  it('goes to the chain that was on the bike that day, and has it estimated anew', async () => {
    let ride: Ride | undefined;
    expect(await asked(async () => (ride = await newRide(mechanic, bike.id)))).toEqual([chain.id]);
    expect(ride).toMatchObject({ chainId: chain.id, source: 'typed', startedAt: null, movingS: null });
    const before = await newRide(browser, bike.id, { day: daysAgo(101) });
    expect(before.chainId).toBeNull();
  });

  it('is edited and deleted, and moves to another bike with both chains estimated anew', async () => {
    const ride = await newRide(browser, bike.id);
    const second = await newBike(browser, rider.id, { name: 'Second' });
    const other = await newChain(browser, second, { label: 'B' });
    const put = () =>
      browser
        .put(`/api/rides/${ride.id}`)
        .send(input({ bikeId: second.id, weather: 'wet' }))
        .expect(200);
    let moved: Ride | undefined;
    expect(await asked(async () => (moved = (await put()).body))).toEqual([chain.id, other.id].sort());
    expect(moved).toMatchObject({ id: ride.id, bikeId: second.id, chainId: other.id, weather: 'wet' });
    expect(await asked(() => browser.delete(`/api/rides/${ride.id}`).expect(200))).toEqual([other.id]);
    await browser.get(`/api/rides/${ride.id}`).expect(404);
  });

  it('is sane: no day to come, none before 1990, a distance that can be', async () => {
    const status = async (change: object) => (await browser.post('/api/rides').send(input(change))).status;
    expect(await status({ day: daysAgo(-1) })).toBe(422);
    expect(await status({ day: '1989-12-31' })).toBe(422);
    expect(await status({ day: '2026-02-30' })).toBe(400);
    expect(await status({ distanceM: 0 })).toBe(400);
    expect(await status({ distanceM: -5 })).toBe(400);
    expect(await status({ distanceM: 2_000_001 })).toBe(400);
    expect(await status({ distanceM: 10.5 })).toBe(400);
    expect(await status({ weather: 'hail' })).toBe(400);
    expect(await status({ day: daysAgo(0), distanceM: 2_000_000 })).toBe(201);
  });

  it('is kept once, however often and at once it is sent under one key', async () => {
    const send = (distanceM: number) =>
      browser.post('/api/rides').set('Idempotency-Key', 'cellar-1').send(input({ distanceM }));
    const answers = await Promise.all([send(1000), send(1000), send(1000)]);
    answers.push(await send(1000));
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201, 201]);
    expect(new Set(answers.map(({ body }) => body.id)).size).toBe(1);
    expect((await browser.get('/api/rides').query({ bikeId: bike.id })).body.total).toBe(1);
    await newRide(browser, bike.id, { distanceM: 1000 });
    expect((await browser.get('/api/rides').query({ bikeId: bike.id })).body.total).toBe(2);
  });

  it('is listed newest first, page by page, between two days', async () => {
    for (const ago of [3, 1, 2, 8]) await newRide(browser, bike.id, { day: daysAgo(ago) });
    const days = async (query: object) => {
      const { body } = await browser
        .get('/api/rides')
        .query({ bikeId: bike.id, ...query })
        .expect(200);
      return body.items.map(({ day }: Ride) => day);
    };
    expect(await days({})).toEqual([1, 2, 3, 8].map(daysAgo));
    expect(await days({ size: 3, page: 2 })).toEqual([daysAgo(8)]);
    expect(await days({ from: daysAgo(3), to: daysAgo(2) })).toEqual([2, 3].map(daysAgo));
    expect(await days({ chainId: chain.id, size: 1 })).toEqual([daysAgo(1)]);
  });

  it('of another rider is not there, nor of another workshop', async () => {
    const otto = await newRider(owner, `Otto ${bike.id.slice(-6)}`, `${bike.id}@rider.example`);
    const theirs = await newRide(owner, (await newBike(owner, otto.id)).id);
    for (const who of [browser, stranger]) {
      await who.get(`/api/rides/${theirs.id}`).expect(404);
      await who.put(`/api/rides/${theirs.id}`).send(input()).expect(404);
      await who.delete(`/api/rides/${theirs.id}`).expect(404);
      await who
        .post('/api/rides')
        .send(input({ bikeId: theirs.bikeId }))
        .expect(404);
      await who.get('/api/rides/by-day').query({ bikeId: theirs.bikeId }).expect(404);
      expect((await who.get('/api/rides').query({ riderId: otto.id })).body.total).toBe(0);
    }
    await mechanic.get(`/api/rides/${theirs.id}`).expect(200);
  });
});

describe('riding by day', () => {
  const byDay = async (query: object): Promise<RidingDay[]> =>
    (await browser.get('/api/rides/by-day').query(query).expect(200)).body.days;

  // estimation.md section 1: wet counts double, gravel 1.5 times, mud 3 (lube) and 4 (wear); common practice.
  it('sums each day in metres and in what they count for', async () => {
    await newRide(browser, bike.id, { day: daysAgo(2), distanceM: 10_000 });
    await newRide(browser, bike.id, { day: daysAgo(2), distanceM: 10_000, weather: 'wet' });
    await newRide(browser, bike.id, {
      day: daysAgo(1),
      distanceM: 10_000,
      surface: 'gravel',
      weather: 'mud',
    });
    const expected = [
      { day: daysAgo(2), distanceM: 20_000, lubeM: 30_000, wearM: 30_000 },
      { day: daysAgo(1), distanceM: 10_000, lubeM: 45_000, wearM: 60_000 },
    ];
    expect(await byDay({ bikeId: bike.id })).toEqual(expected);
    expect(await byDay({ chainId: chain.id, from: daysAgo(1) })).toEqual(expected.slice(1));
  });

  it('goes by the workshop’s own factors', async () => {
    await newRide(browser, bike.id, { distanceM: 10_000, weather: 'damp' });
    const { body: settings } = await owner.get('/api/workshop').expect(200);
    const changed: WorkshopSettings = structuredClone(settings);
    changed.factors.weather.damp = { lube: 5, wear: 7 };
    await owner.put('/api/workshop').send(changed).expect(200);
    expect(await byDay({ bikeId: bike.id })).toMatchObject([{ lubeM: 50_000, wearM: 70_000 }]);
    await owner.put('/api/workshop').send(settings).expect(200);
  });

  it('is of one bike or one chain, and of three years at most', async () => {
    await browser.get('/api/rides/by-day').expect(400);
    await browser.get('/api/rides/by-day').query({ bikeId: bike.id, chainId: chain.id }).expect(400);
    await browser
      .get('/api/rides/by-day')
      .query({ bikeId: bike.id, from: daysAgo(1500) })
      .expect(422);
  });
});
