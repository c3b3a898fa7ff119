import { MigrationInterface, QueryRunner } from 'typeorm';
import { tenantWall } from './tenant-wall';

export class Log1764500000003 implements MigrationInterface {
  name = 'Log1764500000003';

  async up(db: QueryRunner): Promise<void> {
    await db.query(`
      create table ride_import (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        rider_id uuid not null references rider on delete cascade,
        bike_id uuid not null references bike on delete cascade,
        file_name text not null,
        surface text not null,
        weather text not null,
        file bytea,
        state text not null check (state in ('waiting', 'running', 'done', 'failed')),
        total integer not null default 0,
        added integer not null default 0,
        already_there integer not null default 0,
        refused integer not null default 0,
        problems jsonb not null default '[]',
        message text not null default '',
        created_at timestamptz not null default now()
      );
      create table ride (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        bike_id uuid not null references bike on delete cascade,
        chain_id uuid references chain on delete set null,
        day date not null,
        started_at timestamptz,
        distance_m integer not null check (distance_m > 0),
        moving_s integer,
        surface text not null,
        weather text not null,
        notes text not null default '',
        source text not null,
        fingerprint text not null,
        created_at timestamptz not null default now(),
        unique (bike_id, fingerprint)
      );
      create index ride_chain_day on ride (chain_id, day);
      create index ride_bike_day on ride (bike_id, day);
      create table reading (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        chain_id uuid not null references chain on delete cascade,
        day date not null,
        method text not null,
        values_pct real[],
        lower_pct real,
        upper_pct real,
        baseline boolean not null default false,
        notes text not null default '',
        by_name text not null,
        created_at timestamptz not null default now(),
        check (values_pct is not null or lower_pct is not null or upper_pct is not null)
      );
      create index reading_chain on reading (chain_id, day);
      create table treatment (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        chain_id uuid not null references chain on delete cascade,
        day date not null,
        kind text not null,
        arrival text not null,
        notes text not null default '',
        by_name text not null,
        created_at timestamptz not null default now()
      );
      create index treatment_chain on treatment (chain_id, day);
    `);
    await tenantWall(db, 'ride_import', 'ride', 'reading', 'treatment');
  }

  async down(db: QueryRunner): Promise<void> {
    await db.query('drop table treatment, reading, ride, ride_import');
  }
}
