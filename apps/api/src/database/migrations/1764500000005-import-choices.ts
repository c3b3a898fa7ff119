import { MigrationInterface, QueryRunner } from 'typeorm';

/** What the rider says about a file on its way in; and who took a reading, who alone may take it back. */
export class ImportChoices1764500000005 implements MigrationInterface {
  name = 'ImportChoices1764500000005';

  async up(db: QueryRunner): Promise<void> {
    await db.query(`
      alter table ride_import add other_sports text not null default 'leave' check (other_sports in ('leave', 'take'));
      alter table ride_import add matching jsonb;
      alter table reading add by_account_id uuid references account on delete set null;
    `);
  }

  async down(db: QueryRunner): Promise<void> {
    await db.query(`
      alter table reading drop by_account_id;
      alter table ride_import drop matching, drop other_sports;
    `);
  }
}
