import { MigrationInterface, QueryRunner } from 'typeorm';
import { tenantWall } from './tenant-wall';

export class PlannedRiding1764500000008 implements MigrationInterface {
  name = 'PlannedRiding1764500000008';

  async up(db: QueryRunner): Promise<void> {
    await db.query(`
      create table planned_riding (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        bike_id uuid not null references bike on delete cascade,
        name text not null,
        from_day date not null,
        to_day date not null check (to_day >= from_day),
        distance_m integer not null check (distance_m > 0),
        created_at timestamptz not null default now()
      );
      create index planned_riding_bike on planned_riding (bike_id, to_day);
    `);
    await tenantWall(db, 'planned_riding');
  }

  async down(db: QueryRunner): Promise<void> {
    await db.query('drop table planned_riding');
  }
}
