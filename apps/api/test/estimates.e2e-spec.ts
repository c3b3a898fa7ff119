import type {
  Bike,
  Chain,
  ChainEstimate,
  EstimationModel,
  PastEstimate,
  Rider,
  Usage,
  WorkshopSettings,
} from '@halfpitch/contracts';
import { EstimatesTasks } from '../src/estimates/estimates.tasks';
import { RefitTasks } from '../src/estimates/refit.tasks';
import { QueueService } from '../src/jobs/queue.service';
import { BootedApp, bootApp, invited, ownerOfNewWorkshop } from './support/app';
import { ownerQuery } from './support/owner-query';
import { Browser, daysAgo, joined, newBike, newChain, newRide, newRider } from './support/scene';

let booted: BootedApp;
let owner: Browser;
let workshopId: string;
let mechanic: Browser;
let rider: Rider;
let browser: Browser;
let bike: Bike;
let chain: Chain;

beforeAll(async () => {
  booted = await bootApp();
  const made = await ownerOfNewWorkshop(booted, 'North Wheel');
  owner = made.browser;
  workshopId = made.session.workshop.id;
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

const estimateOf = async (who = browser, id = chain.id): Promise<ChainEstimate> =>
  (await who.get(`/api/chains/${id}/estimate`).expect(200)).body;
const idle = () => booted.app.get(QueueService).idle();

it('is made on the spot where there is none yet, and says so', async () => {
  const estimate = await estimateOf();
  expect(estimate).toMatchObject({ chainId: chain.id, dryness: 'fresh', shareUsed: 0, totalKm: 0 });
  expect(estimate.replacement.p10! <= (estimate.replacement.p50 ?? '9999-12-31')).toBe(true);
  expect(estimate.reasons).toMatchObject([{ code: 'first-estimate' }]);
  expect(estimate).not.toHaveProperty('weekly');
});

it('follows a ride within a second', async () => {
  await estimateOf();
  await idle();
  await newRide(browser, bike.id, { distanceM: 120_000, weather: 'wet' });
  const since = Date.now();
  let estimate = await estimateOf();
  while (estimate.totalKm === 0 && Date.now() - since < 5000) {
    await new Promise((resolve) => setTimeout(resolve, 20));
    estimate = await estimateOf();
  }
  expect(Date.now() - since).toBeLessThan(1000);
  expect(estimate).toMatchObject({ totalKm: 120, treatment: { lubeKmUsed: 240 } });
  expect(estimate.alerts.map(({ code }) => code)).toContain('wet-ride-rust');
});

it('starts the treatment anew when the mechanic records one', async () => {
  await newRide(browser, bike.id, { distanceM: 200_000, day: daysAgo(3) });
  await mechanic
    .post('/api/treatments')
    .send({ chainId: chain.id, day: daysAgo(1), kind: 're-wax', arrival: 'turning' })
    .expect(201);
  await newRide(browser, bike.id, { distanceM: 30_000, day: daysAgo(0) });
  await idle();
  expect((await estimateOf()).treatment).toMatchObject({
    kind: 're-wax',
    since: daysAgo(1),
    lubeKmUsed: 30,
  });
  const { cycles }: Usage = (await browser.get(`/api/chains/${chain.id}/usage`).expect(200)).body;
  expect(cycles.map(({ kind, points }) => [kind, points.at(-1)?.km])).toEqual([
    [null, 200],
    ['re-wax', 30],
  ]);
});

it('keeps one estimate a day, and the nightly run twice makes nothing twice', async () => {
  const tasks = booted.app.get(EstimatesTasks);
  await estimateOf();
  await idle();
  await booted.browser().post('/api/test/clock').send({ days: 1 }).expect(200);
  const kept = () =>
    ownerQuery(
      booted,
      'select id, made_on::text, made_at from estimate where chain_id = $1 order by made_on',
      [chain.id],
    );
  const first = await kept();
  expect(first).toHaveLength(2);
  await tasks.estimateWorkshop({ workshopId });
  await Promise.all([tasks.estimateWorkshop({ workshopId }), tasks.estimateWorkshop({ workshopId })]);
  expect(await kept()).toEqual(first);
  const [{ estimated_on }] = await ownerQuery<[{ estimated_on: string }]>(
    booted,
    'select estimated_on::text from workshop where id = $1',
    [workshopId],
  );
  expect(estimated_on).toBe(first.at(-1)!.made_on);
  const past: { items: PastEstimate[] } = (await browser.get(`/api/chains/${chain.id}/estimates`).expect(200))
    .body;
  expect(past.items.map(({ madeAt }) => madeAt.slice(0, 10)).length).toBe(2);
  expect(past.items[0]!.madeAt > past.items[1]!.madeAt).toBe(true);
});

it('shares the riding between chains that take turns', async () => {
  const other = await newChain(browser, bike, { label: 'B', bikeId: null });
  await newRide(browser, bike.id, { distanceM: 150_000, day: daysAgo(10) });
  await browser
    .post(`/api/chains/${other.id}/fit`)
    .send({ bikeId: bike.id, day: daysAgo(9) })
    .expect(200);
  await newRide(browser, bike.id, { distanceM: 150_000, day: daysAgo(2) });
  await idle();
  const boxed = await estimateOf();
  expect(boxed.lubrication).toBeNull();
  expect(boxed.totalKm).toBe(150);
  expect((await estimateOf(browser, other.id)).totalKm).toBe(150);
});

it('is nobody else’s to see', async () => {
  const { browser: stranger } = await ownerOfNewWorkshop(booted, `Elsewhere ${Date.now()}`);
  const someone = await joined(booted, owner, await newRider(owner, `Ron ${Date.now()}`));
  for (const who of [stranger, someone]) {
    for (const what of ['estimate', 'estimates', 'usage'])
      await who.get(`/api/chains/${chain.id}/${what}`).expect(404);
  }
});

it('learns at the end of the night from how chains were found, and keeps it', async () => {
  await newRide(browser, bike.id, { distanceM: 150_000, day: daysAgo(3) });
  await mechanic
    .post('/api/treatments')
    .send({ chainId: chain.id, day: daysAgo(2), kind: 're-wax', arrival: 'dry' })
    .expect(201);
  await ownerQuery(booted, 'update workshop set fleet_model = null where id = $1', [workshopId]);
  await booted.app.get(EstimatesTasks).estimateWorkshop({ workshopId });
  await idle();
  const [{ median, version }] = await ownerQuery<[{ median: string; version: string }]>(
    booted,
    `select fleet_model #>> '{life,kinds,strip-wax,median}' as median, fleet_model ->> 'version' as version
       from workshop where id = $1`,
    [workshopId],
  );
  expect(version).toMatch(/^learned-\d{4}-\d{2}-\d{2}$/);
  expect(Number(median)).toBeLessThan(350);
});

it('is made anew for every chain when the owner changes what a kilometre counts for', async () => {
  await newRide(browser, bike.id, { distanceM: 100_000, weather: 'wet' });
  await idle();
  expect((await estimateOf()).treatment.lubeKmUsed).toBe(200);
  const settings = (await owner.get('/api/workshop').expect(200)).body as WorkshopSettings;
  const { factors } = settings;
  const weather = { ...factors.weather, wet: { lube: 2.5, wear: 2 } };
  await owner
    .put('/api/workshop')
    .send({ ...settings, factors: { ...factors, weather } })
    .expect(200);
  await idle();
  expect((await estimateOf()).treatment.lubeKmUsed).toBe(250);
  await owner.put('/api/workshop').send(settings).expect(200);
  await idle();
  expect((await estimateOf()).treatment.lubeKmUsed).toBe(200);
});

it('tells what the workshop has learned beside what it started from', async () => {
  const modelOf = async (who = browser): Promise<EstimationModel> =>
    (await who.get('/api/model').expect(200)).body;
  const { browser: newOwner, session } = await ownerOfNewWorkshop(booted, 'West Wheel');
  expect(await modelOf(newOwner)).toMatchObject({ learnedOn: null, rates: [], riding: { ownRiders: 0 } });

  const west = await newRider(newOwner, 'Wes West');
  const commuter = await newBike(newOwner, west.id);
  const oiled = await newChain(newOwner, commuter, { regime: 'wet-oil' });
  for (const days of [60, 40, 20])
    await newRide(newOwner, commuter.id, { distanceM: 90_000, day: daysAgo(days) });
  for (const days of [80, 50, 30, 10])
    await newOwner
      .post('/api/treatments')
      .send({ chainId: oiled.id, day: daysAgo(days), kind: 'oil-wet', arrival: 'dry' })
      .expect(201);
  await booted.app.get(RefitTasks).refitWorkshop({ workshopId: session.workshop.id });

  const learned = await modelOf(newOwner);
  expect(learned.learnedOn! >= daysAgo(0)).toBe(true);
  const life = learned.lives.find(({ kind }) => kind === 'oil-wet')!;
  expect(life).toMatchObject({ start: 200, observations: 3 });
  expect(life.median).toBeLessThan(150);
  expect(life.low! < life.median && life.median < life.high!).toBe(true);
  // One rider is too few to learn riding from, and nothing was measured.
  expect(learned).toMatchObject({ rates: [], riding: { ownRiders: 0, shippedRiders: 16 } });
});

it('learns how riding goes on from a workshop with riders enough, between requests', async () => {
  const { browser: newOwner, session } = await ownerOfNewWorkshop(booted, 'East Wheel');
  const workshop = session.workshop.id;
  for (let i = 0; i < 10; i++) {
    const bike = await newBike(newOwner, (await newRider(newOwner, `Rider ${i}`)).id);
    await ownerQuery(
      booted,
      `insert into ride (id, workshop_id, bike_id, day, distance_m, surface, weather, source, fingerprint)
       select gen_random_uuid(), $1, $2, current_date - 400 + d, 12000 + 1000 * ((d * $3::int) % 30), 'road', 'dry',
              'typed', d::text
         from generate_series(1, 399) d where d % (2 + $3::int % 4) = 0`,
      [workshop, bike.id, i + 1],
    );
  }
  const refitting = booted.app.get(RefitTasks).refitWorkshop({ workshopId: workshop });
  const since = Date.now();
  await newOwner.get('/api/workshop').expect(200);
  expect(Date.now() - since).toBeLessThan(1000);
  await refitting;
  const { riding } = (await newOwner.get('/api/model').expect(200)).body as EstimationModel;
  expect(riding).toEqual({ ownRiders: 10, shippedRiders: 16 });
});
