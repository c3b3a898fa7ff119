import { Client } from 'pg';
import { demoSignIns } from '../src/demo/demo-people';
import { loadScenario } from '../src/demo/load-scenario';
import { generateScenario } from '../src/demo/scenario';
import { hashPassword } from '../src/accounts/secrets';
import { BootedApp, bootApp } from './support/app';

jest.setTimeout(120_000);

const scenario = generateScenario({
  seed: 3,
  today: new Date().toISOString().slice(0, 10),
  workshops: 2,
  riders: 10,
  bikes: 14,
  chains: 20,
  years: 1,
});

describe('the demo in a real database', () => {
  let booted: BootedApp;
  let owner: Client;

  beforeAll(async () => {
    booted = await bootApp();
    owner = new Client({ connectionString: booted.ownerUrl });
    await owner.connect();
    const password = demoSignIns()[0]?.password ?? '';
    const passwordHash = await hashPassword(password);
    await loadScenario(owner, scenario, { passwordHash, weeksAgo: [2, 1], say: () => undefined });
  });
  afterAll(async () => {
    await owner.end();
    await booted.close();
  });

  const count = async (table: string) => {
    const { rows } = await owner.query<{ n: number }>(`select count(*)::int as n from ${table}`);
    return rows[0]?.n;
  };

  it('holds every row that was generated, and each ride on the chain that was on the bike that day', async () => {
    const households = scenario.workshops.flatMap((workshop) => [...workshop.households()]);
    const sum = (of: (household: (typeof households)[number]) => unknown[]) =>
      households.reduce((total, household) => total + of(household).length, 0);
    expect(await count('workshop')).toBe(2);
    expect(await count('rider')).toBe(10);
    expect(await count('bike')).toBe(14);
    expect(await count('chain')).toBe(sum(({ chains }) => chains));
    expect(await count('ride')).toBe(sum(({ rides }) => rides));
    expect(await count('reading')).toBe(sum(({ readings }) => readings));
    expect(await count('treatment')).toBe(sum(({ treatments }) => treatments));
    expect(await count('odometer_reading')).toBe(sum(({ odometer }) => odometer));
    expect(await count('estimate')).toBeGreaterThanOrEqual(40);
    const { rows } = await owner.query(`
      select from ride where chain_id is distinct from (
        select chain_id from fitting where fitting.bike_id = ride.bike_id and from_day <= day
          and (to_day is null or to_day >= day) order by from_day desc limit 1)`);
    expect(rows).toHaveLength(0);
  });

  it('lets its people in, each to their own', async () => {
    for (const { email, password, workshop } of demoSignIns()) {
      const browser = booted.browser();
      await browser.post('/api/session').send({ email, password }).expect(201);
      const { body } = await browser.get('/api/chains?size=200').expect(200);
      const town = scenario.workshops.find((one) => one.workshop.name === workshop);
      const own = [...(town?.households() ?? [])].flatMap(({ chains }) => chains.map(({ id }) => id));
      expect(body.items.length).toBeGreaterThan(0);
      for (const { id } of body.items) expect(own).toContain(id);
    }
  });

  it('leaves nothing behind when it breaks off', async () => {
    const before = await count('ride');
    const options = { passwordHash: null, weeksAgo: [], say: () => undefined };
    await expect(loadScenario(owner, scenario, options)).rejects.toThrow(/duplicate key/);
    expect(await count('ride')).toBe(before);
  });
});
