import type { Bike, Chain, Fitting, Rider } from '@halfpitch/contracts';
import { DataSource } from 'typeorm';
import { BootedApp, bootApp, ownerOfNewWorkshop } from './support/app';
import { Browser, daysAgo, joined, newBike, newChain, newRide, newRider } from './support/scene';

let booted: BootedApp;
let owner: Browser;
let workshopId: string;
let stranger: Browser;
let rider: Rider;
let other: Rider;
let browser: Browser;
let bike: Bike;

beforeAll(async () => {
  booted = await bootApp();
  const north = await ownerOfNewWorkshop(booted, 'North Wheel');
  owner = north.browser;
  workshopId = north.session.workshop.id;
  ({ browser: stranger } = await ownerOfNewWorkshop(booted, 'South Wheel'));
  rider = await newRider(owner, 'Rita Rider');
  other = await newRider(owner, 'Otto Other');
  browser = await joined(booted, owner, rider);
});
beforeEach(async () => {
  bike = await newBike(browser, rider.id);
});
afterAll(() => booted.close());

const read = async (chain: Chain): Promise<Chain> =>
  (await browser.get(`/api/chains/${chain.id}`).expect(200)).body;
const fittings = async (chain: Chain): Promise<Fitting[]> =>
  (await browser.get(`/api/chains/${chain.id}/fittings`).expect(200)).body.items;
const fit = (chain: Chain, day: string, bikeId = bike.id) =>
  browser.post(`/api/chains/${chain.id}/fit`).send({ bikeId, day });
const chainOfRide = async (id: string) => (await browser.get(`/api/rides/${id}`).expect(200)).body.chainId;

describe('chains', () => {
  // Limits by speeds: facts.md "Limits" (practice; shop pages read for the first two).
  it.each([
    [12, 0.5],
    [10, 0.75],
    [1, 1],
  ])('of %d speeds are worn out at %d %% unless told otherwise', async (speeds, limitPct) => {
    const chain = await newChain(browser, bike, { speeds });
    expect(chain).toMatchObject({
      limitPct,
      wearLimitPct: null,
      state: null,
      bikeId: bike.id,
      bikeName: bike.name,
    });
    const { label, regime, inServiceOn } = chain;
    const input = { label, regime, inServiceOn, speeds, wearLimitPct: 0.6 };
    expect((await browser.put(`/api/chains/${chain.id}`).send(input).expect(200)).body.limitPct).toBe(0.6);
  });

  it('can neither be from the future nor younger than what happened to them', async () => {
    const chain = await newChain(browser, bike);
    const { label, regime, speeds } = chain;
    const since = (inServiceOn: string) =>
      browser.put(`/api/chains/${chain.id}`).send({ label, regime, speeds, wearLimitPct: null, inServiceOn });
    await since(daysAgo(-1)).expect(422);
    expect((await since(daysAgo(50)).expect(422)).body.detail).toContain(daysAgo(100));
    await since(daysAgo(200)).expect(200);
  });

  it('of others are not there', async () => {
    const theirs = await newChain(owner, await newBike(owner, other.id));
    for (const who of [browser, stranger]) {
      await who.get(`/api/chains/${theirs.id}`).expect(404);
      await who.delete(`/api/chains/${theirs.id}`).expect(404);
      await who.get(`/api/chains/${theirs.id}/fittings`).expect(404);
      await who
        .post(`/api/chains/${theirs.id}/box`)
        .send({ day: daysAgo(0) })
        .expect(404);
      expect((await who.get('/api/chains').query({ riderId: other.id })).body.total).toBe(0);
    }
    const mine = await newChain(browser, bike);
    expect((await fit(mine, daysAgo(1), theirs.bikeId!)).status).toBe(404);
    await owner
      .post(`/api/chains/${mine.id}/fit`)
      .send({ bikeId: theirs.bikeId, day: daysAgo(1) })
      .expect(422);
  });

  it('are found by label, rider or bike, and come with the one due first on request', async () => {
    const made = await Promise.all(
      ['due-c', 'due-a', 'due-b', 'due-none'].map((label) =>
        newChain(browser, bike, { label, bikeId: null }),
      ),
    );
    const due = [
      [null, '2027-03-01'],
      ['2027-05-01', '2027-01-01'],
      ['2027-02-01', null],
    ];
    const owners = new DataSource({ type: 'postgres', url: booted.ownerUrl });
    await owners.initialize();
    for (const [index, [lubrication, replacement]] of due.entries())
      for (const [madeOn, share] of [
        ['2026-11-01', 0.1],
        ['2026-11-30', 0.7],
      ])
        await owners.query(
          `insert into estimate (id, workshop_id, chain_id, made_on, made_at, model_version, share_used,
             lubrication_p50, replacement_p50, detail)
           values (gen_random_uuid(), $1, $2, $3::date, $3::date, 'test', $4, $5, $6, $7)`,
          [workshopId, made[index]!.id, madeOn, share, lubrication, replacement, detail(Number(share))],
        );
    await owners.destroy();
    const found = async (query: object) =>
      (
        await browser
          .get('/api/chains')
          .query({ search: 'DUE-', ...query })
          .expect(200)
      ).body;
    const soonest = await found({ order: 'soonest' });
    expect(soonest.items.map(({ label }: Chain) => label)).toEqual(['due-a', 'due-b', 'due-c', 'due-none']);
    expect(soonest.items[0].state).toMatchObject({ shareUsed: 0.7, dryness: 'turning' });
    expect((await found({ size: 2, page: 2 })).items.map(({ label }: Chain) => label)).toEqual([
      'due-c',
      'due-none',
    ]);
  });
});

function detail(shareUsed: number) {
  const chances = { chanceNow: 0, chanceWithin7: 0, chanceWithin14: 0, chanceWithin30: 0 };
  const replacement = { p10: null, p50: null, p90: null, ...chances, decidedBy: 'distance' };
  return { shareUsed, dryness: 'turning', elongationPct: 0.1, chancePast: 0, lubrication: null, replacement };
}

describe('rotation', () => {
  it('puts the chain that was on the bike into the box', async () => {
    const a = await newChain(browser, bike);
    const b = await newChain(browser, bike, { label: 'B', inServiceOn: daysAgo(40) });
    expect(await read(a)).toMatchObject({ bikeId: null });
    expect(await fittings(a)).toMatchObject([{ from: daysAgo(100), to: daysAgo(41) }]);
    expect(await fittings(b)).toMatchObject([{ from: daysAgo(40), to: null, bikeName: bike.name }]);
  });

  it('leaves no trace of a swap taken back the same day', async () => {
    const a = await newChain(browser, bike);
    const b = await newChain(browser, bike, { label: 'B', bikeId: null });
    await fit(b, daysAgo(3)).expect(200);
    await fit(a, daysAgo(3)).expect(200);
    expect(await fittings(a)).toMatchObject([{ from: daysAgo(100), to: null }]);
    expect(await fittings(b)).toEqual([]);
  });

  it('moves a chain between bikes, one bike at a time, and boxes it', async () => {
    const a = await newChain(browser, bike);
    const second = await newBike(browser, rider.id, { name: 'Second' });
    expect((await fit(a, daysAgo(10), second.id).expect(200)).body.bikeId).toBe(second.id);
    expect((await browser.get(`/api/bikes/${bike.id}`)).body.fittedChainId).toBeNull();
    await browser
      .post(`/api/chains/${a.id}/box`)
      .send({ day: daysAgo(20) })
      .expect(422);
    const boxed = await browser
      .post(`/api/chains/${a.id}/box`)
      .send({ day: daysAgo(5) })
      .expect(200);
    expect(boxed.body.bikeId).toBeNull();
    expect(await fittings(a)).toMatchObject([
      { bikeName: 'Second', from: daysAgo(10), to: daysAgo(5) },
      { bikeName: 'Commuter', from: daysAgo(100), to: daysAgo(11) },
    ]);
  });

  it('refuses days before service, to come, or before a later change', async () => {
    const a = await newChain(browser, bike, { bikeId: null });
    await fit(a, daysAgo(101)).expect(422);
    await fit(a, daysAgo(-1)).expect(422);
    await fit(a, daysAgo(10)).expect(200);
    const b = await newChain(browser, bike, { label: 'B', bikeId: null });
    expect((await fit(b, daysAgo(20)).expect(422)).body.detail).toContain(daysAgo(10));
  });

  it('retires a chain with a reason and takes it back', async () => {
    const a = await newChain(browser, bike);
    const retired = await browser
      .post(`/api/chains/${a.id}/retire`)
      .send({ day: daysAgo(2), because: 'worn' });
    expect(retired.body).toMatchObject({ bikeId: null, retiredOn: daysAgo(2), retiredBecause: 'worn' });
    await fit(a, daysAgo(1)).expect(409);
    const listed = async (flag: string) =>
      (await browser.get('/api/chains').query({ riderId: rider.id, retired: flag, size: 200 })).body.items;
    expect(await listed('yes')).toContainEqual(expect.objectContaining({ id: a.id }));
    expect(await listed('no')).not.toContainEqual(expect.objectContaining({ id: a.id }));
    expect((await browser.post(`/api/chains/${a.id}/return`).expect(200)).body.retiredOn).toBeNull();
    await fit(a, daysAgo(1)).expect(200);
  });
});

describe('rides follow the fitting history', () => {
  it('when a chain is fitted for days already ridden', async () => {
    const ride = await newRide(browser, bike.id, { day: daysAgo(10) });
    expect(ride.chainId).toBeNull();
    const a = await newChain(browser, bike, { bikeId: null });
    await fit(a, daysAgo(11)).expect(200);
    expect(await chainOfRide(ride.id)).toBe(a.id);
  });

  it('when an entry is corrected or removed', async () => {
    const a = await newChain(browser, bike);
    const b = await newChain(browser, bike, { label: 'B', inServiceOn: daysAgo(40) });
    const early = await newRide(browser, bike.id, { day: daysAgo(60) });
    const between = await newRide(browser, bike.id, { day: daysAgo(30) });
    const late = await newRide(browser, bike.id, { day: daysAgo(2) });
    const owned = () => Promise.all([early, between, late].map(({ id }) => chainOfRide(id)));
    expect(await owned()).toEqual([a.id, b.id, b.id]);
    const [[ofA], [ofB]] = [await fittings(a), await fittings(b)];
    const correct = (id: string, from: string, to: string | null) =>
      browser.put(`/api/fittings/${id}`).send({ bikeId: bike.id, from, to });
    expect((await correct(ofA!.id, daysAgo(100), daysAgo(20)).expect(409)).body.detail).toContain('“B”');
    await correct(ofB!.id, daysAgo(19), null).expect(200);
    expect(await owned()).toEqual([a.id, null, b.id]);
    await correct(ofA!.id, daysAgo(100), daysAgo(20)).expect(200);
    expect(await owned()).toEqual([a.id, a.id, b.id]);
    await correct(ofA!.id, daysAgo(101), daysAgo(20)).expect(422);
    await correct(ofA!.id, daysAgo(50), daysAgo(60)).expect(400);
    await stranger
      .put(`/api/fittings/${ofA!.id}`)
      .send({ bikeId: bike.id, from: daysAgo(90), to: null })
      .expect(404);
    await browser.delete(`/api/fittings/${ofB!.id}`).expect(200);
    expect(await owned()).toEqual([a.id, a.id, null]);
  });

  it('and stay with the bike when their chain is removed', async () => {
    const a = await newChain(browser, bike);
    const ride = await newRide(browser, bike.id);
    expect(ride.chainId).toBe(a.id);
    await browser.delete(`/api/chains/${a.id}`).expect(200);
    expect(await chainOfRide(ride.id)).toBeNull();
  });
});
