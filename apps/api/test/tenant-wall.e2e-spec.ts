import { DataSource } from 'typeorm';
import { dataSourceOptions } from '../src/database/data-source';
import { TenantDb } from '../src/database/tenant-db';
import { Rider } from '../src/riders/rider.entity';
import { BootedApp, bootApp, ownerOfNewWorkshop } from './support/app';
import { newRider } from './support/scene';

describe('the tenant wall', () => {
  let booted: BootedApp;
  let here: string;
  let there: string;

  beforeAll(async () => {
    booted = await bootApp();
    const one = await ownerOfNewWorkshop(booted, 'North Side');
    const two = await ownerOfNewWorkshop(booted, 'South Side');
    here = one.session.workshop.id;
    there = two.session.workshop.id;
    await newRider(one.browser, 'Nora North');
    await newRider(two.browser, 'Sam South');
  });
  afterAll(() => booted.close());

  it('shows a query without a WHERE one workshop only', async () => {
    const db = booted.app.get(TenantDb);
    const names = (workshopId: string) =>
      db.run({ workshopId }, async () =>
        (await db.manager.query<{ name: string }[]>('select name from rider')).map((r) => r.name),
      );
    expect(await names(here)).toEqual(['Nora North']);
    expect(await names(there)).toEqual(['Sam South']);
  });

  it('shows nothing at all before a workshop is named', async () => {
    const db = booted.app.get(TenantDb);
    expect(await db.run({}, () => db.manager.find(Rider))).toEqual([]);
  });

  it('refuses to write a row of another workshop', async () => {
    const db = booted.app.get(TenantDb);
    const foreign = Object.assign(new Rider(), {
      workshopId: there,
      name: 'X',
      email: 'x@rider.example',
      stopToken: 'x',
    });
    await expect(db.run({ workshopId: here }, () => db.manager.insert(Rider, foreign))).rejects.toThrow(
      /row-level security/,
    );
  });

  it('stands before every table that has a workshop, and the program can neither bypass nor take it down', async () => {
    const owner = await new DataSource(dataSourceOptions(booted.ownerUrl, 2)).initialize();
    const open = await owner.query<{ table_name: string }[]>(`
      select c.table_name from information_schema.columns c
      join pg_class t on t.relname = c.table_name and t.relnamespace = 'public'::regnamespace
      where c.table_schema = 'public' and c.column_name = 'workshop_id' and t.relkind = 'r'
        and (not t.relrowsecurity or not exists (
          select 1 from pg_policies p where p.tablename = c.table_name and 'halfpitch_app' = any(p.roles)))`);
    const role = await owner.query<{ rolsuper: boolean; rolbypassrls: boolean; owns: string }[]>(`
      select rolsuper, rolbypassrls, (select count(*) from pg_class where relowner = pg_roles.oid)::text as owns
      from pg_roles where rolname = 'halfpitch_app'`);
    await owner.destroy();
    expect(open).toEqual([]);
    expect(role).toEqual([{ rolsuper: false, rolbypassrls: false, owns: '0' }]);
  });
});
