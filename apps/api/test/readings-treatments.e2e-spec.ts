import type { Bike, Chain, Rider } from '@halfpitch/contracts';
import { TreatmentsService } from '../src/treatments/treatments.service';
import { BootedApp, bootApp, invited, ownerOfNewWorkshop } from './support/app';
import { Browser, daysAgo, joined, newBike, newChain, newRider } from './support/scene';

let booted: BootedApp;
let owner: Browser;
let mechanic: Browser;
let desk: Browser;
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
  desk = await invited(booted, owner, { name: 'Dee Desk', email: 'dee@north.example', role: 'desk' });
  rider = await newRider(owner, 'Rita Rider');
  browser = await joined(booted, owner, rider);
  bike = await newBike(browser, rider.id);
});
beforeEach(async () => {
  chain = await newChain(browser, bike, { bikeId: null });
});
afterAll(() => booted.close());

const reading = (change = {}) => ({
  chainId: chain.id,
  day: daysAgo(1),
  method: 'steel-rule',
  values: [0.2, 0.25],
  lower: null,
  upper: null,
  ...change,
});
const readings = async (who = browser) =>
  (await who.get('/api/readings').query({ chainId: chain.id }).expect(200)).body;
const treatment = (change = {}) => ({
  chainId: chain.id,
  day: daysAgo(1),
  kind: 're-wax',
  arrival: 'turning',
  ...change,
});
const treatments = async (who = browser) =>
  (await who.get('/api/treatments').query({ chainId: chain.id }).expect(200)).body;

describe('readings', () => {
  it('are figures or an interval, as they were taken', async () => {
    const figures = await browser
      .post('/api/readings')
      .send(reading({ baseline: true }))
      .expect(201);
    expect(figures.body).toMatchObject({
      values: [0.2, 0.25],
      lower: null,
      upper: null,
      by: 'Rita Rider',
      baseline: true,
    });
    const dropIn = { method: 'drop-in', values: null, lower: 0.5, upper: 0.75, day: daysAgo(0) };
    await mechanic.post('/api/readings').send(reading(dropIn)).expect(201);
    const { total, items } = await readings();
    expect(total).toBe(2);
    expect(items[0]).toMatchObject({ ...dropIn, by: 'Mo Mechanic' });
    await browser.delete(`/api/readings/${items[0].id}`).expect(403);
    await mechanic.delete(`/api/readings/${items[0].id}`).expect(200);
    await browser.delete(`/api/readings/${figures.body.id}`).expect(200);
    expect((await readings()).total).toBe(0);
  });

  it('are kept once, however often and at once they are sent under one key', async () => {
    const send = (by: Browser) => by.post('/api/readings').set('Idempotency-Key', 'cellar-1').send(reading());
    const answers = await Promise.all([send(browser), send(browser)]);
    answers.push(await send(browser));
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201]);
    expect(new Set(answers.map(({ body }) => body.id)).size).toBe(1);
    await send(mechanic).expect(201);
    expect((await readings()).total).toBe(2);
  });

  it.each([
    ['40 %', { values: [40] }, 400],
    ['far too short', { values: [-0.5] }, 400],
    ['nothing', { values: null }, 400],
    ['six places', { values: [0.1, 0.1, 0.1, 0.1, 0.1, 0.1] }, 400],
    ['both kinds', { lower: 0.5 }, 400],
    ['a drop-in gauge with a figure', { method: 'drop-in' }, 400],
    ['an interval upside down', { method: 'drop-in', values: null, lower: 0.75, upper: 0.5 }, 400],
    ['a day to come', { day: daysAgo(-1) }, 422],
    ['a day before service', { day: daysAgo(101) }, 422],
  ])('are refused: %s', async (_, change, status) => {
    await browser.post('/api/readings').send(reading(change)).expect(status);
    expect((await readings()).total).toBe(0);
  });

  it('of others are not there', async () => {
    const mine = (await browser.post('/api/readings').send(reading()).expect(201)).body;
    await stranger.post('/api/readings').send(reading()).expect(404);
    await stranger.delete(`/api/readings/${mine.id}`).expect(404);
    await stranger.get('/api/readings').query({ chainId: chain.id }).expect(404);
    const otto = await newRider(owner, 'Otto', `${chain.id}@rider.example`);
    const other = await joined(booted, owner, otto);
    await other.delete(`/api/readings/${mine.id}`).expect(404);
    await other.get('/api/readings').query({ chainId: chain.id }).expect(404);
  });
});

describe('treatments', () => {
  it('are recorded at the bench with what was measured, and told to who waits for them', async () => {
    const told: string[] = [];
    booted.app
      .get(TreatmentsService)
      .onRecorded.add(async ({ chainId, kind }) => void told.push(`${chainId} ${kind}`));
    const measured = { method: 'three-point', values: [0.31], lower: null, upper: null };
    const { body } = await mechanic
      .post('/api/treatments')
      .send(treatment({ reading: measured }))
      .expect(201);
    expect(body).toMatchObject({ kind: 're-wax', arrival: 'turning', by: 'Mo Mechanic' });
    expect(told).toEqual([`${chain.id} re-wax`]);
    expect(await treatments()).toMatchObject({ total: 1, items: [{ id: body.id }] });
    expect((await readings()).items).toMatchObject([{ day: daysAgo(1), values: [0.31], by: 'Mo Mechanic' }]);
    await mechanic.delete(`/api/treatments/${body.id}`).expect(200);
    expect((await treatments()).total).toBe(0);
  });

  it.each([
    ['a day to come', { day: daysAgo(-1) }, 422],
    ['a day before service', { day: daysAgo(101) }, 422],
    ['a new chain, which is added as one', { kind: 'new-chain' }, 400],
    [
      'nonsense measured with it',
      { reading: { method: 'digital', values: [40], lower: null, upper: null } },
      400,
    ],
  ])('are refused, whole: %s', async (_, change, status) => {
    const refused = await mechanic.post('/api/treatments').send(treatment(change)).expect(status);
    expect(refused.body.detail).toMatch(/\.$|figure\.$/);
    expect((await treatments()).total).toBe(0);
    expect((await readings()).total).toBe(0);
  });

  it('are refused after the chain was retired', async () => {
    await browser
      .post(`/api/chains/${chain.id}/retire`)
      .send({ day: daysAgo(10), because: 'worn' })
      .expect(200);
    await mechanic
      .post('/api/treatments')
      .send(treatment({ day: daysAgo(9) }))
      .expect(422);
    await mechanic
      .post('/api/treatments')
      .send(treatment({ day: daysAgo(10) }))
      .expect(201);
  });

  it('are the bench’s to record and the rider’s to read', async () => {
    await browser.post('/api/treatments').send(treatment()).expect(403);
    await desk.post('/api/treatments').send(treatment()).expect(403);
    await stranger.post('/api/treatments').send(treatment()).expect(404);
    const { body } = await owner.post('/api/treatments').send(treatment()).expect(201);
    await browser.delete(`/api/treatments/${body.id}`).expect(403);
    await stranger.delete(`/api/treatments/${body.id}`).expect(404);
    await stranger.get('/api/treatments').query({ chainId: chain.id }).expect(404);
    expect((await treatments(desk)).total).toBe(1);
    await browser.delete(`/api/chains/${chain.id}`).expect(409);
    await owner.delete(`/api/chains/${chain.id}`).expect(200);
  });
});
