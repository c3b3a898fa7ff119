import type { Page, PageQuery } from '@halfpitch/contracts';
import type { ObjectLiteral, SelectQueryBuilder } from 'typeorm';

/** One page of a query, in the query's own order, with the total. */
export async function pageOf<E extends ObjectLiteral, T>(
  query: SelectQueryBuilder<E>,
  { page, size }: PageQuery,
  toItem: (entity: E) => T,
): Promise<Page<T>> {
  const [rows, total] = await query
    .skip((page - 1) * size)
    .take(size)
    .getManyAndCount();
  return { items: rows.map(toItem), total, page, size };
}
