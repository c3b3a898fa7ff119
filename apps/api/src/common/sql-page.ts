import type { Page, PageQuery } from '@halfpitch/contracts';
import type { EntityManager } from 'typeorm';

/** The parts of a list's SQL; values are $1, $2, … of `where`. */
export interface SqlList {
  columns: string;
  from: string;
  where: string;
  order: string;
  values: unknown[];
}

/** One page of a list that needs joins or counts, in two statements whatever its length. */
export async function pageOfSql<T>(
  manager: EntityManager,
  { columns, from, where, order, values }: SqlList,
  { page, size }: PageQuery,
): Promise<Page<T>> {
  const limit = `limit ${size} offset ${(page - 1) * size}`;
  const items = await manager.query<T[]>(
    `select ${columns} from ${from} where ${where} order by ${order} ${limit}`,
    values,
  );
  const [count] = await manager.query<{ total: number }[]>(
    `select count(*)::int as total from ${from} where ${where}`,
    values,
  );
  return { items, total: count?.total ?? 0, page, size };
}

/** Collects conditions with their values, numbering the placeholders. */
export class Conditions {
  private readonly parts: string[] = [];
  readonly values: unknown[] = [];

  /** Adds `sql` with each `?` standing for `value`, unless there is no value to hold to. */
  add(sql: string, value?: unknown): this {
    if (value === undefined || value === null || value === '') return this;
    this.values.push(value);
    this.parts.push(sql.replaceAll('?', `$${this.values.length}`));
    return this;
  }

  /** Adds a condition without a value. */
  always(sql: string): this {
    this.parts.push(sql);
    return this;
  }

  get where(): string {
    return this.parts.join(' and ') || 'true';
  }
}
