import type { Bike, MadeApiToken, NewApiToken } from '@halfpitch/contracts';
import { BootedApp, bootApp, ownerOfNewWorkshop } from './support/app';
import { ownerQuery } from './support/owner-query';
import { Browser, daysAgo, joined, newBike, newRider } from './support/scene';

describe('personal API tokens', () => {
  let booted: BootedApp;
  let owner: Browser;
  let rider: Browser;
  let bike: Bike;

  beforeAll(async () => {
    booted = await bootApp();
    owner = (await ownerOfNewWorkshop(booted, 'Weir Lane')).browser;
    const rita = await newRider(owner, 'Rita Rider');
    rider = await joined(booted, owner, rita);
    bike = await newBike(rider, rita.id);
  });
  afterAll(() => booted.close());

  const make = async (scopes: NewApiToken['scopes'], browser = rider, lastDay: string | null = null) =>
    (await browser.post('/api/account/tokens').send({ name: 'Script', scopes, lastDay }).expect(201))
      .body as MadeApiToken;
  const ride = () => ({
    bikeId: bike.id,
    day: daysAgo(1),
    distanceM: 21_000,
    surface: 'road',
    weather: 'dry',
  });

  it('lets a script post a ride, once under one key', async () => {
    const { secret } = await make(['rides:write', 'read']);
    const script = booted.browser().set('authorization', `Bearer ${secret}`);
    const post = () => script.post('/api/rides').set('idempotency-key', 'morning-1').send(ride()).expect(201);
    const first = await post();
    expect((await post()).body.id).toBe(first.body.id);
    expect((await script.get('/api/rides').expect(200)).body.total).toBe(1);
  });

  it('goes by the token and not by a session or an origin sent along', async () => {
    const { secret } = await make(['rides:write']);
    const both = (token: string) =>
      owner
        .post('/api/rides')
        .set('authorization', `Bearer ${token}`)
        .set('origin', 'https://elsewhere.example');
    await both(secret).send(ride()).expect(201);
    await both('halfpitch_mistyped').send(ride()).expect(401);
    await owner.get('/api/account/tokens').set('authorization', `Bearer ${secret}`).expect(403);
  });

  it('reaches what its scopes say and never accounts, tokens or more than its person may', async () => {
    const { secret } = await make(['read']);
    const script = booted.browser().set('authorization', `Bearer ${secret}`);
    await script.get('/api/bikes').expect(200);
    await script.post('/api/rides').send(ride()).expect(403);
    await script.get('/api/session').expect(403);
    await script.get('/api/account/tokens').expect(403);
    await script
      .post('/api/account/tokens')
      .send({ name: 'More', scopes: ['read'] })
      .expect(403);
    await script.put('/api/account').send({ name: 'X', distanceUnit: 'km' }).expect(403);
    const ofOwner = await make(['read'], owner);
    await booted.browser().get('/api/staff').set('authorization', `Bearer ${ofOwner.secret}`).expect(403);
  });

  it('shows the secret once, keeps it hashed, and stops when revoked, expired or without membership', async () => {
    const { secret, token } = await make(['read']);
    const call = () => booted.browser().get('/api/bikes').set('authorization', `Bearer ${secret}`);
    await call().expect(200);
    const listed = (await rider.get('/api/account/tokens').expect(200)).body;
    expect(JSON.stringify(listed)).not.toContain(secret);
    expect(listed.items[0]).toMatchObject({ id: token.id, lastUsedAt: expect.any(String), expired: false });
    const kept = await ownerQuery(booted, 'select token_hash from api_token');
    expect(JSON.stringify(kept)).not.toContain(secret);
    await owner.delete(`/api/account/tokens/${token.id}`).expect(404);
    await rider.delete(`/api/account/tokens/${token.id}`).expect(200);
    await call().expect(401);
    await rider
      .post('/api/account/tokens')
      .send({ name: 'Late', scopes: ['read'], lastDay: daysAgo(1) })
      .expect(422);
    const ending = await make(['read'], rider, daysAgo(-1));
    await ownerQuery(booted, 'update api_token set last_day = $1 where id = $2', [
      daysAgo(1),
      ending.token.id,
    ]);
    await booted.browser().get('/api/bikes').set('authorization', `Bearer ${ending.secret}`).expect(401);
  });
});
