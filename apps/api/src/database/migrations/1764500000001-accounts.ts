import { MigrationInterface, QueryRunner } from 'typeorm';
import { APP_ROLE, wall } from './tenant-wall';

export class Accounts1764500000001 implements MigrationInterface {
  name = 'Accounts1764500000001';

  async up(db: QueryRunner): Promise<void> {
    await db.query(`
      create function current_workshop() returns uuid language sql stable
        as $$ select nullif(current_setting('halfpitch.workshop_id', true), '')::uuid $$;
      create function current_account() returns uuid language sql stable
        as $$ select nullif(current_setting('halfpitch.account_id', true), '')::uuid $$;

      create table workshop (
        id uuid primary key,
        name text not null,
        town text not null,
        time_zone text not null,
        currency char(3) not null default 'EUR',
        settings jsonb not null,
        fleet_model jsonb,
        estimated_on date,
        created_at timestamptz not null default now()
      );
      create table account (
        id uuid primary key,
        name text not null,
        email text not null unique,
        password_hash text not null,
        distance_unit text not null default 'km',
        created_at timestamptz not null default now()
      );
      create table member (
        id uuid primary key,
        workshop_id uuid not null references workshop on delete cascade,
        account_id uuid references account on delete cascade,
        role text not null check (role in ('rider', 'mechanic', 'desk', 'owner')),
        rider_id uuid unique,
        name text not null,
        email text not null,
        created_at timestamptz not null default now(),
        unique (workshop_id, email),
        unique (workshop_id, account_id)
      );
      create index member_account on member (account_id);
      create table account_token (
        id uuid primary key,
        purpose text not null check (purpose in ('reset', 'invitation')),
        token_hash text not null unique,
        account_id uuid references account on delete cascade,
        workshop_id uuid references workshop on delete cascade,
        member_id uuid references member on delete cascade,
        expires_at timestamptz not null,
        used_at timestamptz
      );
      create table session (
        sid varchar primary key,
        sess json not null,
        expire timestamp(6) not null
      );
      create index session_expire on session (expire);
      create index session_account on session ((sess -> 'passport' -> 'user' ->> 'accountId'));
      create table sign_in_throttle (
        key varchar(255) primary key,
        points integer not null default 0,
        expire bigint
      );
      grant select, insert, update, delete on session, sign_in_throttle to ${APP_ROLE};
    `);
    await wall(db, 'member', 'workshop_id = current_workshop() or account_id = current_account()');
    await wall(
      db,
      'workshop',
      `id = current_workshop() or exists (
         select 1 from member where member.workshop_id = workshop.id and member.account_id = current_account())`,
    );
    await wall(
      db,
      'account',
      `id = current_account() or exists (
         select 1 from member where member.account_id = account.id and member.workshop_id = current_workshop())`,
    );
    await wall(db, 'account_token', 'workshop_id = current_workshop() or account_id = current_account()');

    // The few questions that must be asked before a workshop is known; each answers one row or one column.
    await db.query(`
      create function account_for_email(address text) returns table (id uuid, password_hash text)
        language sql stable security definer set search_path = public
        as $$ select id, password_hash from account where email = lower(address) $$;
      create function token_for_hash(hash text)
        returns table (id uuid, purpose text, account_id uuid, workshop_id uuid, member_id uuid)
        language sql stable security definer set search_path = public
        as $$ select id, purpose, account_id, workshop_id, member_id from account_token where token_hash = hash $$;
      create function workshop_clock() returns table (id uuid, time_zone text, estimated_on date)
        language sql stable security definer set search_path = public
        as $$ select id, time_zone, estimated_on from workshop $$;
      revoke execute on function account_for_email, token_for_hash, workshop_clock from public;
      grant execute on function account_for_email, token_for_hash, workshop_clock to ${APP_ROLE};
    `);
  }

  async down(db: QueryRunner): Promise<void> {
    await db.query(`
      drop function workshop_clock, token_for_hash, account_for_email;
      drop table sign_in_throttle, session, account_token, member, account, workshop;
      drop function current_account, current_workshop;
    `);
  }
}
