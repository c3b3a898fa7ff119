import { MigrationInterface, QueryRunner } from 'typeorm';
import { tenantWall } from './tenant-wall';

/** A ride that was removed, so that it can be put back as what it was; and what of a file was another sport. */
export class RemovedRides1764500000009 implements MigrationInterface {
  name = 'RemovedRides1764500000009';

  async up(db: QueryRunner): Promise<void> {
    await db.query(`
      create table removed_ride (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        bike_id uuid not null references bike on delete cascade,
        ride jsonb not null,
        removed_at timestamptz not null default now()
      );
      create index removed_ride_at on removed_ride (workshop_id, removed_at);
      alter table ride_import add other_sport integer not null default 0;
      create index ride_import_rider on ride_import (rider_id, created_at);
    `);
    await tenantWall(db, 'removed_ride');
  }

  async down(db: QueryRunner): Promise<void> {
    await db.query(`
      drop index ride_import_rider;
      alter table ride_import drop other_sport;
      drop table removed_ride;
    `);
  }
}
