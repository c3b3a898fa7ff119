import { MigrationInterface, QueryRunner } from 'typeorm';
import { APP_ROLE, tenantWall, wall } from './tenant-wall';

export class EstimatesAndReminders1764500000004 implements MigrationInterface {
  name = 'EstimatesAndReminders1764500000004';

  async up(db: QueryRunner): Promise<void> {
    await db.query(`
      create table estimate (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        chain_id uuid not null references chain on delete cascade,
        made_on date not null,
        made_at timestamptz not null,
        model_version text not null,
        share_used real not null,
        lubrication_p50 date,
        replacement_p50 date,
        detail jsonb not null,
        unique (chain_id, made_on)
      );
      create table mail (
        id uuid primary key,
        workshop_id uuid references workshop on delete cascade,
        account_id uuid references account on delete cascade,
        to_address text not null,
        subject text not null,
        text text not null,
        html text not null,
        headers jsonb not null default '{}',
        state text not null default 'waiting' check (state in ('waiting', 'sending', 'sent', 'failed')),
        attempts integer not null default 0,
        last_error text,
        created_at timestamptz not null default now(),
        sent_at timestamptz
      );
      create table reminder (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        chain_id uuid not null references chain on delete cascade,
        rider_id uuid not null references rider on delete cascade,
        kind text not null check (kind in ('lubrication', 'replacement')),
        cycle text not null,
        mail_id uuid references mail on delete set null,
        held boolean not null default false,
        closed_at timestamptz,
        p10 date,
        p50 date,
        p90 date,
        created_at timestamptz not null default now(),
        unique (chain_id, kind, cycle)
      );
      create index reminder_rider on reminder (rider_id);
      create function stop_token_rider(token text) returns table (rider_id uuid, workshop_id uuid)
        language sql stable security definer set search_path = public
        as $$ select id, workshop_id from rider where stop_token = token $$;
      revoke execute on function stop_token_rider from public;
      grant execute on function stop_token_rider to ${APP_ROLE};
    `);
    await tenantWall(db, 'estimate', 'reminder');
    await wall(db, 'mail', 'workshop_id = current_workshop() or account_id = current_account()');
  }

  async down(db: QueryRunner): Promise<void> {
    await db.query('drop function stop_token_rider; drop table reminder, mail, estimate');
  }
}
