import { QueryRunner } from 'typeorm';

/** The role the program connects as: it owns nothing and cannot bypass row-level security. */
export const APP_ROLE = 'halfpitch_app';

/** Lets the program use a table, behind row-level security with the condition `visible` for reading and writing. */
export async function wall(db: QueryRunner, table: string, visible: string): Promise<void> {
  await db.query(`grant select, insert, update, delete on ${table} to ${APP_ROLE}`);
  await db.query(`alter table ${table} enable row level security`);
  await db.query(
    `create policy ${table}_wall on ${table} to ${APP_ROLE} using (${visible}) with check (${visible})`,
  );
}

/** The wall of an ordinary tenant table: rows of the current workshop and no others. */
export function tenantWall(db: QueryRunner, ...tables: string[]): Promise<void> {
  return tables.reduce(
    (before, table) => before.then(() => wall(db, table, 'workshop_id = current_workshop()')),
    Promise.resolve(),
  );
}
