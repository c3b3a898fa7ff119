import { BootedApp, bootApp, invited, ownerOfNewWorkshop } from './support/app';
import { Browser, joined, newBike, newChain, newRider } from './support/scene';

let booted: BootedApp;
let owner: Browser;
let mechanic: Browser;
let desk: Browser;
let stranger: Browser;

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
});
afterAll(() => booted.close());

describe('riders', () => {
  it('are registered by the desk, found by part of name, address or phone, and counted with what they own', async () => {
    const rider = await newRider(desk, 'Ada Test');
    const bike = await newBike(desk, rider.id);
    await newChain(desk, bike);
    await newChain(desk, bike, { label: 'B', bikeId: null });
    for (const search of ['ada', 'TEST', 'ada.test@']) {
      const { body } = await mechanic.get('/api/riders').query({ search }).expect(200);
      expect(body).toMatchObject({
        total: 1,
        items: [{ id: rider.id, access: 'none', bikes: 1, chains: 2 }],
      });
    }
    const { body } = await mechanic.get('/api/riders').query({ search: '%' }).expect(200);
    expect(body.items).toEqual([]);
  });

  it('come page by page, in the order of their names', async () => {
    for (const name of ['Page C', 'Page A', 'Page B']) await newRider(owner, name);
    const names = async (page: number) => {
      const { body } = await owner.get('/api/riders').query({ search: 'page', size: 2, page }).expect(200);
      expect(body.total).toBe(3);
      return body.items.map(({ name }: { name: string }) => name);
    };
    expect(await names(1)).toEqual(['Page A', 'Page B']);
    expect(await names(2)).toEqual(['Page C']);
    expect(await names(3)).toEqual([]);
    await owner.get('/api/riders').query({ size: 1000 }).expect(400);
  });

  it('have one address each, in one workshop', async () => {
    const { email } = await newRider(owner, 'Once Only');
    const again = await owner
      .post('/api/riders')
      .send({ name: 'Twice', email: email.toUpperCase() })
      .expect(409);
    expect(again.body.detail).toContain(email);
    await newRider(stranger, 'Once Only', email);
  });

  it('are invited, join, and see and change only themselves', async () => {
    const rider = await newRider(owner, 'Rita Rider');
    const other = await newRider(owner, 'Otto Other');
    const browser = await joined(booted, desk, rider);
    expect((await desk.get(`/api/riders/${rider.id}`).expect(200)).body.access).toBe('joined');
    await desk
      .put(`/api/riders/${rider.id}`)
      .send({ name: 'Rita Rider', email: rider.email, notes: 'pays late' });
    const self = (await browser.get('/api/riders/me').expect(200)).body;
    expect(self).toMatchObject({ id: rider.id, name: 'Rita Rider' });
    expect(self).not.toHaveProperty('notes');
    const change = {
      name: 'Rita R.',
      email: rider.email,
      phone: '1',
      distanceUnit: 'mi',
      remindersOn: false,
    };
    expect((await browser.put('/api/riders/me').send(change).expect(200)).body).toMatchObject(change);
    expect((await desk.get(`/api/riders/${rider.id}`)).body).toMatchObject({
      notes: 'pays late',
      remindersOn: false,
    });
    await browser.get('/api/riders').expect(403);
    await browser.get(`/api/riders/${other.id}`).expect(403);
    await browser.delete(`/api/riders/${rider.id}`).expect(403);
  });

  it('move with their open invitation to a new address', async () => {
    const rider = await newRider(owner, 'Move Me');
    const invitation = await owner.post(`/api/riders/${rider.id}/invitation`).expect(201);
    expect(invitation.body.access).toBe('invited');
    const moved = { name: rider.name, email: 'moved@rider.example' };
    await owner.put(`/api/riders/${rider.id}`).send(moved).expect(200);
    await joined(booted, owner, { ...rider, ...moved });
    expect((await owner.get(`/api/riders/${rider.id}`)).body.access).toBe('joined');
  });

  it('are reminded or not, as the desk sets', async () => {
    const rider = await newRider(owner, 'Remind Me');
    const off = await desk.put(`/api/riders/${rider.id}/reminders`).send({ on: false }).expect(200);
    expect(off.body.remindersOn).toBe(false);
    await mechanic.put(`/api/riders/${rider.id}/reminders`).send({ on: true }).expect(403);
  });

  it('go with everything of theirs', async () => {
    const rider = await newRider(owner, 'Gone Soon');
    const bike = await newBike(owner, rider.id);
    await mechanic.delete(`/api/riders/${rider.id}`).expect(403);
    await desk.delete(`/api/riders/${rider.id}`).expect(200, { done: true });
    await owner.get(`/api/riders/${rider.id}`).expect(404);
    await owner.get(`/api/bikes/${bike.id}`).expect(404);
  });

  it('are nobody’s but their workshop’s', async () => {
    const rider = await newRider(owner, 'Walled In');
    await stranger.get(`/api/riders/${rider.id}`).expect(404);
    await stranger.put(`/api/riders/${rider.id}`).send({ name: 'X', email: 'x@y.example' }).expect(404);
    await stranger.delete(`/api/riders/${rider.id}`).expect(404);
    await stranger.post(`/api/riders/${rider.id}/invitation`).expect(404);
    expect((await stranger.get('/api/riders').query({ search: 'walled' })).body.total).toBe(0);
    await booted.browser().get('/api/riders').expect(401);
    await owner.get('/api/riders/not-an-id').expect(400);
  });
});
