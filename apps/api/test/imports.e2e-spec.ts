import type { Bike, Chain, Rider, RideImport } from '@halfpitch/contracts';
import { gzipSync } from 'node:zlib';
import { DataSource } from 'typeorm';
import { ImportBatch } from '../src/rides/import-batch';
import { BootedApp, bootApp, ownerOfNewWorkshop } from './support/app';
import { Browser, daysAgo, joined, newBike, newChain, newRide, newRider } from './support/scene';

let booted: BootedApp;
let owner: Browser;
let stranger: Browser;
let rider: Rider;
let browser: Browser;
let bike: Bike;
let chain: Chain;

beforeAll(async () => {
  booted = await bootApp();
  ({ browser: owner } = await ownerOfNewWorkshop(booted, 'North Wheel'));
  ({ browser: stranger } = await ownerOfNewWorkshop(booted, 'South Wheel'));
  rider = await newRider(owner, 'Rita Rider');
  browser = await joined(booted, owner, rider);
});
beforeEach(async () => {
  bike = await newBike(browser, rider.id);
  chain = await newChain(browser, bike, { inServiceOn: daysAgo(3000) });
});
afterEach(() => jest.restoreAllMocks());
afterAll(() => booted.close());

/** A log of so many rides, one a day, every distance another. */
function log(rides: number): string {
  const lines = Array.from({ length: rides }, (_, i) => `${daysAgo(rides - i)},${(5 + i / 100).toFixed(2)},`);
  return ['date,distance_km,indoor', ...lines, ''].join('\n');
}

const send = (file: string | Buffer, name: string, fields: Record<string, string> = { bikeId: bike.id }) =>
  browser.post('/api/imports').field(fields).attach('file', Buffer.from(file), name);

async function finished(id: string): Promise<RideImport> {
  for (let i = 0; i < 200; i++) {
    const { body } = await browser.get(`/api/imports/${id}`).expect(200);
    if (body.state === 'done' || body.state === 'failed') return body;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  throw new Error('The import did not end.');
}
async function imported(
  file: string | Buffer,
  name: string,
  fields?: Record<string, string>,
): Promise<RideImport> {
  const { body } = await send(file, name, fields).expect(202);
  expect(body).toMatchObject({ state: 'waiting', fileName: name });
  return finished(body.id);
}
const rides = async () => (await browser.get('/api/rides').query({ bikeId: bike.id, size: 200 })).body;

describe('a log of rides', () => {
  it('is taken in whole, and again without doubling anything', async () => {
    const file = log(450);
    const once = { state: 'done', total: 450, added: 450, alreadyThere: 0, refused: 0, problems: [] };
    expect(await imported(file, 'log.csv')).toMatchObject(once);
    expect(await imported(file, 'log again.csv', { chainId: chain.id })).toMatchObject({
      added: 0,
      alreadyThere: 450,
    });
    const { total, items } = await rides();
    expect(total).toBe(450);
    expect(items[0]).toMatchObject({
      day: daysAgo(1),
      distanceM: 9490,
      source: 'csv',
      chainId: chain.id,
      weather: 'unknown',
    });
  });

  it('goes on after a crash where it stopped, and counts right', async () => {
    const keep = ImportBatch.prototype.keep;
    let calls = 0;
    jest.spyOn(ImportBatch.prototype, 'keep').mockImplementation(function (this: ImportBatch, ...batch) {
      if (++calls === 2) throw new Error('pulled the plug');
      return keep.apply(this, batch);
    });
    const { body } = await send(log(450), 'crash.csv').expect(202);
    await retryAtOnce();
    const end = await finished(body.id);
    expect(end).toMatchObject({ state: 'done', added: 450, alreadyThere: 0 });
    expect(calls).toBe(4);
    expect((await rides()).total).toBe(450);
  });

  it('tells line by line what was wrong, and keeps the rest', async () => {
    const file = `date,distance_km\n${daysAgo(5)},10\n${daysAgo(4)},far\n${daysAgo(-9)},11\n${daysAgo(3)},12\n`;
    const end = await imported(file, 'part.csv');
    expect(end).toMatchObject({ state: 'done', total: 4, added: 2, refused: 2 });
    expect(end.problems.map(({ line }) => line)).toEqual([3, 4]);
  });

  it('takes surface and weather from the file, else as told', async () => {
    const file = `date,distance_km,indoor\n${daysAgo(3)},12,1\n${daysAgo(2)},12,0\n`;
    await imported(file, 'mixed.csv', { bikeId: bike.id, surface: 'gravel', weather: 'damp' });
    expect((await rides()).items).toMatchObject([
      { surface: 'gravel', weather: 'damp' },
      { surface: 'indoor', weather: 'dry' },
    ]);
  });
});

it('is read as the rider matched its columns', async () => {
  const [year, month, day] = daysAgo(3).split('-');
  const file = `day;far\n${day}/${month}/${year};12,5\n`;
  const matching = {
    delimiter: ';',
    hasHeader: true,
    decimal: ',',
    dateOrder: 'dmy',
    distanceUnit: 'mi',
    timeUnit: 'h',
    shortClock: 'h:m',
    columns: { date: 0, distance: 1 },
  };
  const fields = { bikeId: bike.id, matching: JSON.stringify(matching) };
  expect(await imported(file, 'miles.csv', fields)).toMatchObject({ added: 1 });
  expect((await rides()).items).toMatchObject([{ day: daysAgo(3), distanceM: 20_117 }]);
  await send(file, 'miles.csv', { bikeId: bike.id, matching: '{oops' }).expect(400);
  await send(file, 'miles.csv', { bikeId: bike.id, matching: '{}' }).expect(400);
});

/** Spares the pause that the queue makes before it tries again. */
async function retryAtOnce(): Promise<void> {
  const database = booted.app.get(DataSource);
  for (let i = 0; i < 100; i++) {
    const [, tried] = await database.query(
      `update pgboss.job set start_after = now() where name = 'import-rides' and state = 'retry'`,
    );
    if (tried > 0) return;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  throw new Error('Nothing waits to be tried again.');
}

/** Points every minute along a meridian, `stepM` apart. */
function gpx(start: Date, minutes: number, stepM: number): string {
  const points = Array.from({ length: minutes + 1 }, (_, i) => {
    const lat = 48 + (i * stepM) / 111_195;
    return `<trkpt lat="${lat.toFixed(7)}" lon="9"><time>${new Date(start.getTime() + i * 60_000).toISOString()}</time></trkpt>`;
  });
  return `<?xml version="1.0"?><gpx version="1.1" creator="spec" xmlns="http://www.topografix.com/GPX/1/1">
    <trk><type>cycling</type><trkseg>${points.join('')}</trkseg></trk></gpx>`;
}

describe('the same ride', () => {
  const start = new Date(`${daysAgo(6)}T08:00:00Z`);

  it('from a second device is already there', async () => {
    expect(await imported(gpx(start, 60, 300), 'one.gpx')).toMatchObject({ added: 1 });
    const second = gpx(new Date(start.getTime() + 90_000), 58, 305);
    expect(await imported(gzipSync(second), 'two.gpx.gz')).toMatchObject({ added: 0, alreadyThere: 1 });
    const later = gpx(new Date(start.getTime() + 5 * 3_600_000), 60, 300);
    expect(await imported(later, 'later.gpx')).toMatchObject({ added: 1 });
    expect((await rides()).items[0]).toMatchObject({ source: 'gpx', startedAt: expect.any(String) });
  });

  it('typed in before is already there', async () => {
    await newRide(browser, bike.id, { day: daysAgo(6), distanceM: 18_010 });
    expect(await imported(gpx(start, 60, 300), 'typed.gpx')).toMatchObject({ added: 0, alreadyThere: 1 });
  });
});

describe('what cannot be taken in', () => {
  it.each([
    ['empty.csv', ''],
    ['picture.png', Buffer.from([0x89, 0x50, 0x4e, 0x47, 0, 1, 2, 3])],
    ['page.html', '<html><body>Hello</body></html>'],
    ['broken.gpx', '<gpx><trk><trkseg><trkpt lat="1"'],
  ])('is told in a sentence: %s', async (name, file) => {
    const end = await imported(file, name);
    expect(end).toMatchObject({ state: 'failed', added: 0 });
    expect(end.message).toMatch(/^[A-Z“].+[.]$/);
  });

  it('is refused before anything is kept: too large, no file, two targets, a chain in the box', async () => {
    expect((await send(Buffer.alloc(20 * 1024 * 1024 + 1), 'big.fit').expect(413)).body.detail).toContain(
      '20 MB',
    );
    await browser.post('/api/imports').field({ bikeId: bike.id }).expect(422);
    const broken = browser.post('/api/imports').set('Content-Type', 'multipart/form-data; boundary=x');
    expect((await broken.send('--x\r\nContent-Dis').expect(400)).body.detail).toContain('broke off');
    await send('x', 'x.csv', { bikeId: bike.id, chainId: chain.id }).expect(400);
    await send('x', 'x.csv', {}).expect(400);
    await browser
      .post(`/api/chains/${chain.id}/box`)
      .send({ day: daysAgo(0) })
      .expect(200);
    expect((await send('x', 'x.csv', { chainId: chain.id }).expect(422)).body.detail).toContain(
      'fit it first',
    );
  });

  it('is anything for a bike of another workshop, or from who is not signed in', async () => {
    const mine = await send(log(3), 'mine.csv').expect(202);
    const attempt = (who: Browser) =>
      who
        .post('/api/imports')
        .field({ bikeId: bike.id })
        .attach('file', Buffer.from(log(1)), 'log.csv');
    await attempt(stranger).expect(404);
    await attempt(booted.browser()).expect(401);
    await stranger.get(`/api/imports/${mine.body.id}`).expect(404);
    await owner.get(`/api/imports/${mine.body.id}`).expect(200);
  });
});

describe('a ride of a file', () => {
  const file = () => `date,distance_km\n${daysAgo(5)},10.5\n${daysAgo(4)},12.5\n`;

  it('regression: put back after it was removed, is the same ride of the same file', async () => {
    await imported(file(), 'log.csv');
    const [ride] = (await rides()).items;
    await browser.delete(`/api/rides/${ride.id}`).expect(200);
    await stranger.post(`/api/rides/${ride.id}/restore`).expect(404);
    expect((await browser.post(`/api/rides/${ride.id}/restore`).expect(200)).body).toEqual(ride);
    expect((await browser.post(`/api/rides/${ride.id}/restore`).expect(200)).body).toEqual(ride);
    expect(await imported(file(), 'log.csv')).toMatchObject({ added: 0, alreadyThere: 2 });
  });

  it('is not put back where its file brought it back first', async () => {
    await imported(file(), 'log.csv');
    const [ride] = (await rides()).items;
    await browser.delete(`/api/rides/${ride.id}`).expect(200);
    expect(await imported(file(), 'log.csv')).toMatchObject({ added: 1, alreadyThere: 1 });
    await browser.post(`/api/rides/${ride.id}/restore`).expect(409);
    expect((await rides()).total).toBe(2);
  });

  it('regression: moved to another bike, is not brought back by its file, nor doubled on the way home', async () => {
    await imported(file(), 'log.csv');
    const [{ id, day, distanceM, surface, weather }] = (await rides()).items;
    const second = await newBike(browser, rider.id, { name: 'Second' });
    const move = (bikeId: string) =>
      browser.put(`/api/rides/${id}`).send({ bikeId, day, distanceM, surface, weather }).expect(200);
    await move(second.id);
    expect(await imported(file(), 'log.csv')).toMatchObject({ added: 0, alreadyThere: 2 });
    await move(bike.id);
    expect(await imported(file(), 'log.csv')).toMatchObject({ added: 0, alreadyThere: 2 });
  });
});

it('lists the files that were sent, newest first, to the rider and the staff', async () => {
  const run = gpx(new Date(`${daysAgo(8)}T08:00:00Z`), 20, 150).replace('cycling', 'running');
  const sent = [await imported(log(2), 'first.csv'), await imported(run, 'second.gpx')];
  const { body } = await browser.get('/api/imports').query({ size: 2 }).expect(200);
  expect(body.items).toEqual(sent.reverse());
  expect(body.items[0]).toMatchObject({ bikeId: bike.id, refused: 1, otherSport: 1 });
  expect((await owner.get('/api/imports').query({ riderId: rider.id, size: 2 })).body.items).toEqual(sent);
  expect((await stranger.get('/api/imports').query({ riderId: rider.id })).body.total).toBe(0);
});
