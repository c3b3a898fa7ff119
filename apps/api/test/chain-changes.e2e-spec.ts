import { DataSource } from 'typeorm';
import { ChainChanges } from '../src/chains/chain-changes';
import { TenantDb } from '../src/database/tenant-db';
import { BootedApp, bootApp, ownerOfNewWorkshop } from './support/app';
import { Browser, newBike, newChain, newRide, newRider } from './support/scene';

let booted: BootedApp;
let browser: Browser;
let workshopId: string;

beforeAll(async () => {
  booted = await bootApp({ ROLE: 'http' });
  const north = await ownerOfNewWorkshop(booted, 'North Wheel');
  browser = north.browser;
  workshopId = north.session.workshop.id;
});
afterAll(() => booted.close());

/** The tasks for this chain that a worker could take up now, as the queue's own query sees them. */
const free = (chainId: string) =>
  booted.app
    .get(DataSource)
    .query(
      `select data from pgboss.job where state = 'created' and singleton_key = $1 for update skip locked`,
      [chainId],
    );

it('asks for one estimate of a chain, however much changes before it is made', async () => {
  const bike = await newBike(browser, (await newRider(browser, 'Rita Rider')).id);
  const chain = await newChain(browser, bike);
  for (let i = 0; i < 3; i++) await newRide(browser, bike.id);
  await browser
    .put(`/api/bikes/${bike.id}`)
    .send({ ...bike, kind: 'e-bike' })
    .expect(200);
  expect(await free(chain.id)).toEqual([{ data: { workshopId, chainId: chain.id } }]);
});

it('keeps a waiting estimate waiting until the change that asks for it is committed', async () => {
  const bike = await newBike(browser, (await newRider(browser, 'Otto Other')).id);
  const chain = await newChain(browser, bike);
  expect(await free(chain.id)).toHaveLength(1);
  await booted.app.get(TenantDb).run({ workshopId }, async () => {
    await booted.app.get(ChainChanges).changed(chain.id);
    expect(await free(chain.id)).toHaveLength(0);
  });
  expect(await free(chain.id)).toHaveLength(1);
});

it('asks for nothing when the change is not committed', async () => {
  const bike = await newBike(browser, (await newRider(browser, 'Ada Third')).id);
  const chain = await newChain(browser, bike, { bikeId: null });
  await booted.app.get(DataSource).query(`delete from pgboss.job where singleton_key = $1`, [chain.id]);
  const broken = booted.app.get(TenantDb).run({ workshopId }, async () => {
    await booted.app.get(ChainChanges).changed(chain.id);
    throw new Error('changed its mind');
  });
  await expect(broken).rejects.toThrow('changed its mind');
  expect(await free(chain.id)).toEqual([]);
});
