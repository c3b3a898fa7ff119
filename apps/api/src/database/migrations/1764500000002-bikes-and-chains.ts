import { MigrationInterface, QueryRunner } from 'typeorm';
import { tenantWall } from './tenant-wall';

export class BikesAndChains1764500000002 implements MigrationInterface {
  name = 'BikesAndChains1764500000002';

  async up(db: QueryRunner): Promise<void> {
    await db.query(`
      create table rider (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        name text not null,
        email text not null,
        phone text not null default '',
        notes text not null default '',
        distance_unit text not null default 'km',
        reminders_on boolean not null default true,
        stop_token text not null unique,
        created_at timestamptz not null default now(),
        unique (workshop_id, email)
      );
      alter table member add foreign key (rider_id) references rider on delete cascade;
      create table bike (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        rider_id uuid not null references rider on delete cascade,
        name text not null,
        kind text not null,
        speeds smallint not null,
        brake_fluid text not null,
        notes text not null default '',
        created_at timestamptz not null default now()
      );
      create index bike_rider on bike (workshop_id, rider_id);
      create table odometer_reading (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        bike_id uuid not null references bike on delete cascade,
        day date not null,
        odometer_m integer not null check (odometer_m >= 0),
        unique (bike_id, day)
      );
      create table chain (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        rider_id uuid not null references rider on delete cascade,
        label text not null,
        speeds smallint not null,
        regime text not null,
        wear_limit_pct real,
        in_service_on date not null,
        retired_on date,
        retired_because text,
        created_at timestamptz not null default now()
      );
      create index chain_rider on chain (workshop_id, rider_id);
      create table fitting (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        chain_id uuid not null references chain on delete cascade,
        bike_id uuid not null references bike on delete cascade,
        from_day date not null,
        to_day date check (to_day >= from_day)
      );
      create index fitting_chain on fitting (chain_id);
      create unique index fitting_one_chain_on_a_bike on fitting (bike_id) where to_day is null;
      create unique index fitting_one_bike_for_a_chain on fitting (chain_id) where to_day is null;
    `);
    await tenantWall(db, 'rider', 'bike', 'odometer_reading', 'chain', 'fitting');
  }

  async down(db: QueryRunner): Promise<void> {
    await db.query(`
      drop table fitting, chain, odometer_reading, bike;
      alter table member drop constraint member_rider_id_fkey;
      drop table rider;
    `);
  }
}
