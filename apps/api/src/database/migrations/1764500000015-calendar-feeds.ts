import { MigrationInterface, QueryRunner } from 'typeorm';
import { APP_ROLE, wall } from './tenant-wall';

/** Secret calendar addresses, kept hashed; found by their hash before the workshop is known. */
export class CalendarFeeds1764500000015 implements MigrationInterface {
  name = 'CalendarFeeds1764500000015';

  async up(db: QueryRunner): Promise<void> {
    await db.query(`
      create table calendar_feed (
        account_id uuid not null references account on delete cascade,
        workshop_id uuid not null references workshop on delete cascade,
        token_hash text not null unique,
        made_at timestamptz not null,
        primary key (account_id, workshop_id)
      );
      create function calendar_feed_for_hash(hash text) returns table (account_id uuid, workshop_id uuid)
        language sql stable security definer set search_path = public
        as $$ select account_id, workshop_id from calendar_feed where token_hash = hash $$;
      revoke execute on function calendar_feed_for_hash from public;
      grant execute on function calendar_feed_for_hash to ${APP_ROLE};
    `);
    await wall(db, 'calendar_feed', 'account_id = current_account()');
  }

  async down(db: QueryRunner): Promise<void> {
    await db.query('drop function calendar_feed_for_hash; drop table calendar_feed');
  }
}
