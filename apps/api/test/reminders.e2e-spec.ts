import { Test } from '@nestjs/testing';
import type { Bike, Chain, Page, Reminder, Rider } from '@halfpitch/contracts';
import { AppModule } from '../src/app.module';
import { readEnvironment } from '../src/config/environment';
import { EstimatesTasks } from '../src/estimates/estimates.tasks';
import { QueueService } from '../src/jobs/queue.service';
import { BootedApp, bootApp, ownerOfNewWorkshop } from './support/app';
import { ownerQuery } from './support/owner-query';
import { Browser, daysAgo, newBike, newChain, newRide, newRider } from './support/scene';

let booted: BootedApp;
let owner: Browser;
let workshopId: string;
let rider: Rider;
let bike: Bike;
let chain: Chain;
let number = 0;

beforeAll(async () => {
  booted = await bootApp();
  const made = await ownerOfNewWorkshop(booted, 'North Wheel');
  owner = made.browser;
  workshopId = made.session.workshop.id;
});
beforeEach(async () => {
  rider = await newRider(owner, `Rider ${++number}`, `rider${number}@rider.example`);
  bike = await newBike(owner, rider.id);
  chain = await newChain(owner, bike);
});
afterEach(() => booted.mail.behave({ mode: 'accept' }));
afterAll(() => booted.close());

const idle = () => booted.app.get(QueueService).idle();
const letters = () => booted.mail.lettersTo(rider.email);
const reminders = async (): Promise<Reminder[]> =>
  ((await owner.get(`/api/reminders?chainId=${chain.id}`).expect(200)).body as Page<Reminder>).items;
const wearOut = () => newRide(owner, bike.id, { distanceM: 600_000, day: daysAgo(2) });
const sendNow = (more = {}) =>
  owner.post('/api/reminders').send({ chainId: chain.id, kind: 'lubrication', ...more });
/** Tries waiting letters again at once, without waiting out the queue's patience. */
async function retry(): Promise<void> {
  await ownerQuery(
    booted,
    `update pgboss.job set start_after = now() where name = 'send-mail' and state = 'retry'`,
  );
  await idle();
}

it('is written when a ride uses the treatment up: window, reason, link and ways to stop', async () => {
  await wearOut();
  const letter = await booted.mail.letterTo(rider.email);
  await idle();
  expect(letter.subject).toBe('Commuter: the chain is due for a re-wax, now or soon');
  expect(letter.text).toContain(`/chains/${chain.id}`);
  expect(letter.text).toMatch(/due now|likely/);
  expect(letter.text).toMatch(/600 km have been ridden|moved it/);
  const headers = new Map(Object.entries(letter.headers).map(([name, value]) => [name.toLowerCase(), value]));
  expect(headers.get('list-unsubscribe')).toMatch(/^<http:\/\/127\.0\.0\.1:4190\/api\/stop\/[\w-]+>$/);
  expect(headers.get('list-unsubscribe-post')).toBe('List-Unsubscribe=One-Click');
  expect(await reminders()).toMatchObject([
    { kind: 'lubrication', state: 'sent', attempts: 1, riderName: rider.name, email: rider.email },
  ]);
});

it('comes once, however many schedulers run at the same time', async () => {
  const env = readEnvironment({
    NODE_ENV: 'test',
    PORT: '0',
    PUBLIC_URL: 'http://127.0.0.1:4190',
    DATABASE_URL: booted.databaseUrl,
    SMTP_URL: `smtp://127.0.0.1:${booted.mail.smtpPort}`,
    MAIL_FROM: 'Test workshop <post@workshop.example>',
  });
  const module = await Test.createTestingModule({ imports: [AppModule.in(env)] }).compile();
  const second = await module.createNestApplication({ logger: ['error', 'fatal'] }).init();
  try {
    await idle();
    // As if nothing had been estimated yet today.
    await ownerQuery(booted, 'delete from estimate');
    await ownerQuery(
      booted,
      `insert into ride (id, workshop_id, bike_id, chain_id, day, distance_m, surface, weather,
      source, fingerprint) values (gen_random_uuid(), $1, $2, $3, $4, 900000, 'road', 'dry', 'typed', 'x')`,
      [workshopId, bike.id, chain.id, daysAgo(3)],
    );
    const tasks = [booted.app.get(EstimatesTasks), second.get(EstimatesTasks)];
    await Promise.all([...tasks, ...tasks].map((task) => task.estimateWorkshop({ workshopId })));
    await Promise.all(tasks.map((task) => task.estimateChain({ workshopId, chainId: chain.id })));
    await idle();
    expect(await letters()).toHaveLength(1);
    expect(await reminders()).toHaveLength(1);
  } finally {
    await second.close();
  }
});

it('does not come again night after night, and a treatment closes it and opens the next cycle', async () => {
  await newRide(owner, bike.id, { distanceM: 600_000, day: daysAgo(90) });
  await idle();
  const tasks = booted.app.get(EstimatesTasks);
  for (let i = 0; i < 3; i++) await tasks.estimateChain({ workshopId, chainId: chain.id });
  await idle();
  expect(await letters()).toHaveLength(1);
  await owner
    .post('/api/treatments')
    .send({ chainId: chain.id, day: daysAgo(1), kind: 're-wax', arrival: 'quiet' })
    .expect(201);
  await idle();
  expect(await reminders()).toMatchObject([{ state: 'closed' }]);
  await newRide(owner, bike.id, { distanceM: 2_000_000, day: daysAgo(0) });
  await idle();
  expect(await letters()).toHaveLength(2);
  expect((await reminders()).map(({ state }) => state)).toEqual(['sent', 'closed']);
});

it('is tried again after the server refused it, and then sent once', async () => {
  await booted.mail.behave({ mode: 'try-later' });
  await wearOut();
  await idle();
  expect(await reminders()).toMatchObject([{ state: 'waiting', attempts: 1, sentAt: null }]);
  expect((await reminders())[0]!.lastError).toBeTruthy();
  await retry();
  expect(await reminders()).toMatchObject([{ state: 'waiting', attempts: 2 }]);
  await booted.mail.behave({ mode: 'accept' });
  await retry();
  await retry();
  expect(await reminders()).toMatchObject([{ state: 'sent', attempts: 3, lastError: null }]);
  expect(await letters()).toHaveLength(1);
});

it('is not sent a second time when the connection ended after it was handed over', async () => {
  await booted.mail.behave({ mode: 'drop', times: 1 });
  await wearOut();
  await idle();
  await retry();
  const [reminder] = await reminders();
  expect(reminder).toMatchObject({ state: 'failed', attempts: 1 });
  expect(reminder!.lastError).toMatch(/may have arrived/);
  expect((await letters()).length).toBeLessThanOrEqual(1);
  await sendNow().expect(409);
  await sendNow({ again: true }).expect(201);
  await idle();
  expect(await reminders()).toMatchObject([{ state: 'sent' }]);
});

it('is sent by the desk before it is due, once, and again only when asked for', async () => {
  await idle();
  await sendNow().expect(201);
  await idle();
  expect(await reminders()).toMatchObject([{ state: 'sent' }]);
  const refused = await sendNow().expect(409);
  expect(refused.body.detail).toMatch(/sent in this cycle already/);
  await sendNow({ again: true }).expect(201);
  await wearOut();
  await idle();
  expect(await letters()).toHaveLength(2);
});

it('stays where it is while held, from before it is written or while it waits', async () => {
  await idle();
  const { body: held } = await sendNow({ hold: true }).expect(201);
  expect(held.state).toBe('held');
  await wearOut();
  await idle();
  expect(await letters()).toHaveLength(0);
  await booted.mail.behave({ mode: 'try-later' });
  await owner.post(`/api/reminders/${held.id}/release`).expect(200);
  await idle();
  expect((await owner.post(`/api/reminders/${held.id}/hold`).expect(200)).body.state).toBe('held');
  await booted.mail.behave({ mode: 'accept' });
  await retry();
  expect(await letters()).toHaveLength(0);
  await owner.post(`/api/reminders/${held.id}/release`).expect(200);
  await idle();
  expect(await letters()).toHaveLength(1);
  await owner.post(`/api/reminders/${held.id}/hold`).expect(409);
  expect((await owner.get('/api/reminders?state=held').expect(200)).body.items).toEqual([]);
});

it('stops at one click, without signing in, and starts again from the page', async () => {
  await wearOut();
  const letter = await booted.mail.letterTo(rider.email);
  await idle();
  const token = /\/stop\/([\w-]+)/.exec(letter.text)![1]!;
  const anyone = booted.browser();
  expect((await anyone.get(`/api/stop/${token}`).expect(200)).body).toEqual({
    workshopName: 'North Wheel',
    email: rider.email,
    remindersOn: true,
  });
  const click = await anyone.post(`/api/stop/${token}`).type('form').send('List-Unsubscribe=One-Click');
  expect([click.status, click.body.remindersOn]).toEqual([200, false]);
  await sendNow({ again: true }).expect(409);
  const again = await newChain(owner, bike, { label: 'B', inServiceOn: daysAgo(20) });
  await newRide(owner, bike.id, { distanceM: 900_000, day: daysAgo(1) });
  await idle();
  expect(again.id).not.toBe(chain.id);
  expect(await letters()).toHaveLength(1);
  expect((await anyone.post(`/api/stop/${token}`).send({ on: true }).expect(200)).body.remindersOn).toBe(
    true,
  );
  await anyone.post(`/api/stop/${token}`).send({ nonsense: true }).expect(400);
  await anyone.get('/api/stop/nobody-has-this-one').expect(404);
});

it('of a retired chain is closed, and none is written about it', async () => {
  await booted.mail.behave({ mode: 'try-later' });
  await wearOut();
  await idle();
  await owner
    .post(`/api/chains/${chain.id}/retire`)
    .send({ day: daysAgo(0), because: 'worn' })
    .expect(200);
  await idle();
  expect(await reminders()).toMatchObject([{ state: 'closed' }]);
  await booted.mail.behave({ mode: 'accept' });
  await retry();
  expect(await letters()).toHaveLength(0);
  await sendNow().expect(409);
});

it('of another workshop is out of reach', async () => {
  const { browser: stranger } = await ownerOfNewWorkshop(booted, 'South Wheel');
  await wearOut();
  await idle();
  const [{ id }] = (await reminders()) as [Reminder];
  expect((await stranger.get('/api/reminders').expect(200)).body.total).toBe(0);
  await stranger.post(`/api/reminders/${id}/hold`).expect(404);
  await stranger.post('/api/reminders').send({ chainId: chain.id, kind: 'lubrication' }).expect(404);
});
