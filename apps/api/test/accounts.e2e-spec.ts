import { BootedApp, bootApp, invited, ownerOfNewWorkshop, PASSWORD } from './support/app';

const tokenIn = (text: string, page: string) => new RegExp(`/${page}/([\\w-]+)`).exec(text)?.[1] ?? '';

describe('accounts', () => {
  let booted: BootedApp;
  let owner: Awaited<ReturnType<typeof ownerOfNewWorkshop>>;

  beforeAll(async () => {
    booted = await bootApp();
    owner = await ownerOfNewWorkshop(booted, 'Weir Lane');
  });
  afterAll(() => booted.close());

  const signIn = (email: string, password: string) =>
    booted.browser().post('/api/session').send({ email, password });

  it('makes who registers a workshop its owner', () => {
    expect(owner.session).toMatchObject({ role: 'owner', workshop: { name: 'Weir Lane' }, riderId: null });
  });

  it('signs in under a session id of its own, and out', async () => {
    const browser = booted.browser();
    const { headers } = await browser
      .post('/api/session')
      .send({ email: owner.email.toUpperCase(), password: PASSWORD })
      .expect(201);
    expect(headers['set-cookie']?.[0]).toMatch(/^halfpitch=.*HttpOnly; SameSite=Lax/);
    await browser.get('/api/session').expect(200);
    await browser.delete('/api/session').expect(200);
    const answer = await browser.get('/api/session').expect(401);
    expect(answer.headers['content-type']).toMatch('application/problem+json');
  });

  it('answers a wrong password and an unknown address alike', async () => {
    const wrong = await signIn(owner.email, 'not the password').expect(401);
    const unknown = await signIn('nobody@nowhere.example', 'not the password').expect(401);
    expect(wrong.body).toEqual(unknown.body);
  });

  it('invites staff by a link that works once', async () => {
    const who = { name: 'Mika Mechanic', email: 'mika@weir.example', role: 'mechanic' as const };
    const mechanic = await invited(booted, owner.browser, who);
    expect((await mechanic.get('/api/session').expect(200)).body.role).toBe('mechanic');
    await mechanic.get('/api/staff').expect(403);
    const token = tokenIn((await booted.mail.letterTo(who.email)).text, 'invitation');
    await booted
      .browser()
      .post(`/api/invitations/${token}`)
      .send({ name: 'X', password: PASSWORD })
      .expect(410);
    await owner.browser.post('/api/staff').send(who).expect(409);
  });

  it('lets somebody who has an account join a second workshop with it, and change between them', async () => {
    const other = await ownerOfNewWorkshop(booted, 'Mill Race');
    await other.browser
      .post('/api/staff')
      .send({ name: 'Olive', email: owner.email, role: 'desk' })
      .expect(201);
    const token = tokenIn((await booted.mail.letterTo(owner.email)).text, 'invitation');
    const browser = booted.browser();
    expect((await browser.get(`/api/invitations/${token}`).expect(200)).body).toMatchObject({
      hasAccount: true,
      role: 'desk',
    });
    await browser
      .post(`/api/invitations/${token}`)
      .send({ name: 'Olive', password: 'another password' })
      .expect(422);
    await browser.post(`/api/invitations/${token}`).send({ name: 'Olive', password: PASSWORD }).expect(201);
    const session = (await browser.get('/api/session').expect(200)).body;
    expect(session).toMatchObject({ role: 'desk', workshop: { name: 'Mill Race' } });
    expect(session.workshops).toHaveLength(2);
    const moved = await browser
      .post('/api/session/workshop')
      .send({ workshopId: owner.session.workshop.id })
      .expect(201);
    expect(moved.body).toMatchObject({ role: 'owner', workshop: { name: 'Weir Lane' } });
  });

  it('gives a new password by e-mail, once, and never tells whether an address exists', async () => {
    const { browser, email } = await ownerOfNewWorkshop(booted, 'Ford End');
    const known = await booted.browser().post('/api/password/forgotten').send({ email }).expect(201);
    const unknown = await booted
      .browser()
      .post('/api/password/forgotten')
      .send({ email: 'no@one.example' })
      .expect(201);
    expect(known.body).toEqual(unknown.body);
    const token = tokenIn((await booted.mail.letterTo(email)).text, 'reset');
    const fresh = { token, password: 'a fresh long password' };
    await booted.browser().post('/api/password/reset').send(fresh).expect(201);
    await booted.browser().post('/api/password/reset').send(fresh).expect(410);
    await browser.get('/api/session').expect(401);
    await signIn(email, PASSWORD).expect(401);
    await signIn(email, fresh.password).expect(201);
  });

  it('keeps no token and no letter with a link in the clear', async () => {
    const { email } = await ownerOfNewWorkshop(booted, 'Lock Keep');
    await booted.browser().post('/api/password/forgotten').send({ email }).expect(201);
    const token = tokenIn((await booted.mail.letterTo(email)).text, 'reset');
    await booted.browser().post('/api/test/idle').expect(200);
    const { DataSource } = await import('typeorm');
    const database = await new DataSource({ type: 'postgres', url: booted.ownerUrl }).initialize();
    const rows = await database.query(
      `select 1 from mail where text || html like $1 union all select 1 from account_token where token_hash = $2`,
      [`%${token}%`, token],
    );
    await database.destroy();
    expect(rows).toEqual([]);
  });

  it('changes the password here and signs out everywhere else', async () => {
    const { browser, email } = await ownerOfNewWorkshop(booted, 'Toll Bar');
    const elsewhere = booted.browser();
    await elsewhere.post('/api/session').send({ email, password: PASSWORD }).expect(201);
    await browser.put('/api/password').send({ current: 'wrong', password: 'the next password' }).expect(422);
    await browser.put('/api/password').send({ current: PASSWORD, password: 'the next password' }).expect(200);
    await elsewhere.get('/api/session').expect(401);
    await browser.get('/api/session').expect(200);
    await browser.delete('/api/session/everywhere').expect(200);
    await browser.get('/api/session').expect(401);
  });

  it('stops guessing after ten tries', async () => {
    const { email } = await ownerOfNewWorkshop(booted, 'Low Gate');
    for (let i = 0; i < 10; i++) await signIn(email, 'a guess').expect(401);
    const refused = await signIn(email, PASSWORD).expect(429);
    expect(refused.body.detail).toMatch(/Wait \d+ minutes/);
  });

  it('refuses writes that come from another site', async () => {
    await owner.browser
      .put('/api/account')
      .set('Origin', 'https://elsewhere.example')
      .send({ name: 'X', distanceUnit: 'km' })
      .expect(403);
    await owner.browser
      .put('/api/account')
      .set('Sec-Fetch-Site', 'cross-site')
      .send({ name: 'X', distanceUnit: 'km' })
      .expect(403);
  });

  it('names each field that is wrong', async () => {
    const { body } = await booted
      .browser()
      .post('/api/workshops')
      .send({ email: 'nonsense', password: 'short' })
      .expect(400);
    expect(body.errors.map((e: { path: string }) => e.path)).toEqual(
      expect.arrayContaining(['email', 'password', 'workshopName']),
    );
  });
});
