import type { Rider } from '@halfpitch/contracts';
import { BootedApp, bootApp, ownerOfNewWorkshop } from './support/app';
import { Browser, daysAgo, joined, newBike, newChain, newRide, newRider } from './support/scene';

let booted: BootedApp;
let owner: Browser;
let stranger: Browser;
let rider: Rider;
let other: Rider;
let browser: Browser;

beforeAll(async () => {
  booted = await bootApp();
  ({ browser: owner } = await ownerOfNewWorkshop(booted, 'North Wheel'));
  ({ browser: stranger } = await ownerOfNewWorkshop(booted, 'South Wheel'));
  rider = await newRider(owner, 'Rita Rider');
  other = await newRider(owner, 'Otto Other');
  browser = await joined(booted, owner, rider);
});
afterAll(() => booted.close());

describe('bikes', () => {
  it('are added by their rider or the workshop, and changed', async () => {
    const bike = await newBike(browser, rider.id);
    expect(bike).toMatchObject({ riderName: 'Rita Rider', fittedChainId: null, notes: '' });
    const { riderId: _, riderName: __, fittedChainId: ___, id, ...input } = bike;
    const changed = await owner
      .put(`/api/bikes/${id}`)
      .send({ ...input, kind: 'gravel' })
      .expect(200);
    expect(changed.body).toMatchObject({ ...bike, kind: 'gravel' });
    await browser
      .put(`/api/bikes/${id}`)
      .send({ ...input, speeds: 40 })
      .expect(400);
  });

  it('tell the chain that is on them', async () => {
    const bike = await newBike(browser, rider.id);
    const chain = await newChain(browser, bike);
    expect((await browser.get(`/api/bikes/${bike.id}`)).body.fittedChainId).toBe(chain.id);
  });

  it('are listed for staff rider by rider, for a rider their own only', async () => {
    const theirs = await newBike(owner, other.id);
    const ids = async (who: Browser, query = {}) => {
      const { body } = await who
        .get('/api/bikes')
        .query({ size: 200, ...query })
        .expect(200);
      return body.items.map(({ id }: { id: string }) => id);
    };
    expect(await ids(owner)).toContain(theirs.id);
    expect(await ids(owner, { riderId: other.id })).toEqual([theirs.id]);
    expect(await ids(browser)).not.toContain(theirs.id);
    expect(await ids(browser, { riderId: other.id })).toEqual([]);
    expect(await ids(stranger)).toEqual([]);
  });

  it('of others are not there: for riders, for other workshops', async () => {
    const theirs = await newBike(owner, other.id);
    const input = { name: 'Mine now', kind: 'road', speeds: 11, brakeFluid: 'none' };
    for (const who of [browser, stranger]) {
      await who.get(`/api/bikes/${theirs.id}`).expect(404);
      await who.put(`/api/bikes/${theirs.id}`).send(input).expect(404);
      await who.delete(`/api/bikes/${theirs.id}`).expect(404);
      await who.get(`/api/bikes/${theirs.id}/odometer`).expect(404);
      await who
        .post('/api/bikes')
        .send({ ...input, riderId: other.id })
        .expect(404);
    }
  });

  it('go with their rides; their chains stay, in the box', async () => {
    const bike = await newBike(browser, rider.id);
    const chain = await newChain(browser, bike);
    const ride = await newRide(browser, bike.id);
    await browser.delete(`/api/bikes/${bike.id}`).expect(200);
    await browser.get(`/api/rides/${ride.id}`).expect(404);
    expect((await browser.get(`/api/chains/${chain.id}`)).body).toMatchObject({
      bikeId: null,
      bikeName: null,
    });
  });
});

describe('the odometer', () => {
  it('never runs backwards', async () => {
    const bike = await newBike(browser, rider.id);
    const at = (day: string, km: number) =>
      browser.post(`/api/bikes/${bike.id}/odometer`).send({ day, odometerM: km * 1000 });
    await at(daysAgo(30), 1000).expect(201);
    await at(daysAgo(10), 1500).expect(201);
    const less = await at(daysAgo(5), 1499).expect(422);
    expect(less.body).toMatchObject({ errors: [{ path: 'odometerM' }] });
    expect(less.body.detail).toContain('1,500 km');
    await at(daysAgo(20), 1501).expect(422);
    await at(daysAgo(20), 1200).expect(201);
    await at(daysAgo(-1), 2000).expect(422);
    await at(daysAgo(1), -1).expect(400);
  });

  it('keeps one figure for a day, the last one given, until it is removed', async () => {
    const bike = await newBike(browser, rider.id);
    for (const odometerM of [5000, 7000])
      await browser
        .post(`/api/bikes/${bike.id}/odometer`)
        .send({ day: daysAgo(3), odometerM })
        .expect(201);
    const { body } = await browser.get(`/api/bikes/${bike.id}/odometer`).expect(200);
    expect(body).toMatchObject({ total: 1, items: [{ day: daysAgo(3), odometerM: 7000 }] });
    await browser.delete(`/api/bikes/${bike.id}/odometer/${body.items[0].id}`).expect(200);
    await browser.delete(`/api/bikes/${bike.id}/odometer/${body.items[0].id}`).expect(404);
  });
});
