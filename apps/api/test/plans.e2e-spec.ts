import type { Bike, Chain, ChainEstimate, Page, Plan, Rider } from '@halfpitch/contracts';
import { QueueService } from '../src/jobs/queue.service';
import { BootedApp, bootApp, ownerOfNewWorkshop } from './support/app';
import { Browser, daysAgo, joined, newBike, newChain, newRide, newRider } from './support/scene';

let booted: BootedApp;
let owner: Browser;
let browser: Browser;
let rider: Rider;
let bike: Bike;
let chain: Chain;

beforeAll(async () => {
  booted = await bootApp();
  ({ browser: owner } = await ownerOfNewWorkshop(booted, 'North Wheel'));
  rider = await newRider(owner, 'Rita Rider');
  browser = await joined(booted, owner, rider);
  bike = await newBike(browser, rider.id);
  chain = await newChain(browser, bike);
  for (let days = 60; days >= 1; days -= 3)
    await newRide(browser, bike.id, { distanceM: 9_000, day: daysAgo(days) });
  await idle();
});
afterAll(() => booted.close());

const idle = () => booted.app.get(QueueService).idle();
const ahead = (days: number) => daysAgo(-days);
const week = (change: Partial<Plan> = {}) => ({
  bikeId: bike.id,
  name: 'A training week',
  from: ahead(10),
  to: ahead(16),
  distanceM: 600_000,
  ...change,
});
const estimateOf = async (): Promise<ChainEstimate> =>
  (await browser.get(`/api/chains/${chain.id}/estimate`).expect(200)).body;
const plans = async (who = browser): Promise<Plan[]> =>
  ((await who.get('/api/plans').expect(200)).body as Page<Plan>).items;

it('moves the window, says what it does to the chain, and is gone without a trace', async () => {
  const before = await estimateOf();
  const plan = (await browser.post('/api/plans').send(week()).expect(201)).body as Plan;
  await idle();
  const planned = await estimateOf();
  expect(planned.lubrication!.p50! < before.lubrication!.p50!).toBe(true);
  expect(planned.lubrication!.p90! <= ahead(16)).toBe(true);
  const [listed] = await plans();
  expect(listed).toMatchObject({
    id: plan.id,
    bikeName: 'Commuter',
    outlook: { chainLabel: 'A', comeInBy: ahead(9) },
  });
  expect(listed!.outlook!.lubrication.byEnd).toBeGreaterThan(0.9);
  expect(listed!.outlook!.lubrication.before).toBeLessThan(listed!.outlook!.lubrication.byEnd);
  expect(listed!.outlook!.treatments).toBeGreaterThan(1);

  await browser
    .put(`/api/plans/${plan.id}`)
    .send(week({ distanceM: 20_000 }))
    .expect(200);
  await idle();
  expect((await estimateOf()).lubrication!.p50! > planned.lubrication!.p50!).toBe(true);

  await browser.delete(`/api/plans/${plan.id}`).expect(200);
  await idle();
  expect((await estimateOf()).lubrication).toEqual(before.lubrication);
  expect(await plans()).toEqual([]);
});

it('counts only its days to come: what was ridden of it is in the log', async () => {
  const running = week({ from: ahead(-6), to: ahead(0) });
  const before = (await estimateOf()).lubrication;
  const plan = (await browser.post('/api/plans').send(running).expect(201)).body as Plan;
  await idle();
  expect((await estimateOf()).lubrication).toEqual(before);
  await browser.delete(`/api/plans/${plan.id}`).expect(200);
});

it('refuses what cannot be planned, in words', async () => {
  const refusal = async (change: Partial<Plan>) =>
    (
      await browser
        .post('/api/plans')
        .send(week(change))
        .expect((r) => expect([400, 422]).toContain(r.status))
    ).body.errors[0];
  expect(await refusal({ from: ahead(5), to: ahead(4) })).toEqual({
    path: 'to',
    message: 'The last day is before the first.',
  });
  expect((await refusal({ from: daysAgo(9), to: daysAgo(2) })).message).toContain('is over');
  expect((await refusal({ distanceM: -5 })).message).toBe(
    'The planned distance can’t be negative.'.replace('’', "'"),
  );
  expect((await refusal({ distanceM: 0 })).message).toContain('Give the distance');
  expect((await refusal({ to: ahead(900) })).message).toBe('A plan lasts a year at most.');
});

it('is the rider’s own, and the staff’s', async () => {
  const plan = (await owner.post('/api/plans').send(week()).expect(201)).body as Plan;
  expect((await plans()).map(({ id }) => id)).toEqual([plan.id]);
  const other = await joined(booted, owner, await newRider(owner, 'Otto Other'));
  expect(await plans(other)).toEqual([]);
  await other.get(`/api/plans/${plan.id}`).expect(404);
  await other.put(`/api/plans/${plan.id}`).send(week()).expect(404);
  await other.delete(`/api/plans/${plan.id}`).expect(404);
  await other.post('/api/plans').send(week()).expect(404);
});
