import { MigrationInterface, QueryRunner } from 'typeorm';
import { APP_ROLE, wall } from './tenant-wall';

/** Tokens with which a person's scripts call, kept hashed; found by their hash before the workshop is known. */
export class ApiTokens1764500000011 implements MigrationInterface {
  name = 'ApiTokens1764500000011';

  async up(db: QueryRunner): Promise<void> {
    await db.query(`
      create table api_token (
        id uuid primary key,
        account_id uuid not null references account on delete cascade,
        workshop_id uuid not null references workshop on delete cascade,
        name text not null,
        token_hash text not null unique,
        scopes text[] not null,
        last_day date,
        last_used_at timestamptz,
        created_at timestamptz not null default now()
      );
      create index api_token_account on api_token (account_id, created_at);
      create function api_token_for_hash(hash text) returns table (id uuid, account_id uuid, workshop_id uuid)
        language sql stable security definer set search_path = public
        as $$ select id, account_id, workshop_id from api_token where token_hash = hash $$;
      revoke execute on function api_token_for_hash from public;
      grant execute on function api_token_for_hash to ${APP_ROLE};
    `);
    await wall(db, 'api_token', 'account_id = current_account()');
  }

  async down(db: QueryRunner): Promise<void> {
    await db.query('drop function api_token_for_hash; drop table api_token');
  }
}
