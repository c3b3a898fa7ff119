import type { CalendarFeed, MadeCalendarFeed } from '@halfpitch/contracts';
import ICAL from 'ical.js';
import { QueueService } from '../src/jobs/queue.service';
import { BootedApp, bootApp, ownerOfNewWorkshop } from './support/app';
import { ownerQuery } from './support/owner-query';
import { Browser, daysAgo, joined, newBike, newChain, newRide, newRider } from './support/scene';

let booted: BootedApp;
let browser: Browser;
let owner: Browser;

beforeAll(async () => {
  booted = await bootApp();
  ({ browser: owner } = await ownerOfNewWorkshop(booted, 'North Wheel'));
  const rider = await newRider(owner, 'Rita Rider');
  browser = await joined(booted, owner, rider);
  const bike = await newBike(browser, rider.id);
  await newChain(browser, bike, { label: 'Ferry A' });
  await newRide(browser, bike.id, { distanceM: 250_000 });
  await booted.app.get(QueueService).idle();
  const hills = { bikeId: bike.id, name: 'Hills', from: daysAgo(-20), to: daysAgo(-22), distanceM: 300_000 };
  await browser.post('/api/plans').send(hills).expect(201);
});
afterAll(() => booted.close());

const made = async (): Promise<string> =>
  new URL(((await browser.post('/api/calendar').expect(201)).body as MadeCalendarFeed).address).pathname;
const fetched = (path: string) => booted.browser().get(path).buffer(true);

it('is read without a session by a parser of the standard, and stops when renewed or stopped', async () => {
  expect((await browser.get('/api/calendar').expect(200)).body as CalendarFeed).toEqual({ madeAt: null });
  const first = await made();
  const answer = await fetched(first).expect(200);
  expect(answer.headers['content-type']).toBe('text/calendar; charset=utf-8');
  const calendar = new ICAL.Component(ICAL.parse(answer.text) as never);
  const summaries = calendar.getAllSubcomponents('vevent').map((event) => new ICAL.Event(event).summary);
  expect(summaries).toContain('Re-wax: Ferry A, Commuter');
  expect(summaries).toContain('Hills: 300 km, Commuter');

  const second = await made();
  await fetched(first).expect(404);
  await fetched(second).expect(200);
  await browser.delete('/api/calendar').expect(200);
  await fetched(second).expect(404);
});

it('keeps no secret, and shows nobody else’s chains', async () => {
  const path = await made();
  const token = path.split('/').at(-1)!.replace('.ics', '');
  const [row] = await ownerQuery<{ token_hash: string }[]>(booted, 'select token_hash from calendar_feed');
  expect(row!.token_hash).not.toContain(token);
  const other = await joined(booted, owner, await newRider(owner, 'Otto Other'));
  const theirs = new URL(((await other.post('/api/calendar').expect(201)).body as MadeCalendarFeed).address)
    .pathname;
  expect((await fetched(theirs).expect(200)).text).not.toContain('Ferry A');
  await fetched('/api/calendar/no-such-token.ics').expect(404);
});
