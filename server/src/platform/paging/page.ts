import { type Expression, type OrderByExpression, type SelectQueryBuilder, sql } from 'kysely';
import { fieldFault } from '../errors/app-error.js';
import type { PageQuery } from './page-query.dto.js';

/** One page of a list, and how many rows there are over all pages. */
export interface Page<Item> {
  readonly items: Item[];
  readonly total: number;
}

/** The columns a list can be sorted by: the client's name for each, and what stands behind it in SQL. */
export type SortMap = Readonly<Record<string, string | Expression<unknown>>>;

/**
 * Adds the order asked for, through a fixed map, so that no text of the client's reaches SQL as a name.
 * The tie-breaker comes last, so that pages do not overlap.
 *
 * @param usual what is sorted by when the query says nothing, such as `-recordedAt`
 * @throws AppError `invalid_input` for a column that is not in the map
 */
export function sorted<DB, TB extends keyof DB, Row>(
  query: SelectQueryBuilder<DB, TB, Row>,
  asked: string | undefined,
  columns: SortMap,
  usual: string,
  tieBreaker: string,
): SelectQueryBuilder<DB, TB, Row> {
  const sort = asked ?? usual;
  const backwards = sort.startsWith('-');
  const name = backwards ? sort.slice(1) : sort;
  const column = Object.hasOwn(columns, name) ? columns[name] : undefined;
  if (column === undefined) throw fieldFault('/sort', 'sort', 'This list cannot be sorted by that.');
  const direction = backwards ? 'desc' : 'asc';
  type Column = OrderByExpression<DB, TB, Row>;
  return query.orderBy(column as Column, direction).orderBy(tieBreaker as Column, direction);
}

/** Cuts the page asked for out of a list. */
export function paged<DB, TB extends keyof DB, Row>(
  query: SelectQueryBuilder<DB, TB, Row>,
  page: Pick<PageQuery, 'page' | 'pageSize'>,
): SelectQueryBuilder<DB, TB, Row> {
  return query.limit(page.pageSize).offset((page.page - 1) * page.pageSize);
}

/** How many rows a list has in all; sorting and columns of the query do not matter. */
export async function countOf<DB, TB extends keyof DB, Row>(query: SelectQueryBuilder<DB, TB, Row>): Promise<number> {
  const count = sql<number>`count(*)`.as('total');
  const row = await query.clearSelect().clearOrderBy().select(count).executeTakeFirstOrThrow();
  return (row as { total: number }).total;
}

/** A pattern for `ilike` that finds the words anywhere, with `%`, `_` and `\` meaning themselves. */
export function containing(words: string): string {
  return `%${words.replaceAll(/[\\%_]/g, (wildcard) => `\\${wildcard}`)}%`;
}
