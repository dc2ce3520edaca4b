import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { StockValueQuery } from './stock-value.dto.js';

export interface StockValueRow {
  readonly part: string;
  readonly name: string;
  readonly measure: string;
  readonly traced: string;
  readonly quantity: string;
  readonly valueMinor: number;
}

const sortColumns = { part: 'p.code', name: 'p.name', value: sql`"valueMinor"`, quantity: sql`quantity` };

@Injectable()
export class StockValueRepository {
  async findPage(handle: Kysely<DB>, query: StockValueQuery): Promise<Page<StockValueRow>> {
    let found = handle.selectFrom('part as p').innerJoin(
      (from) =>
        from
          .selectFrom('cost_pool')
          .select([
            'part_id',
            sql<string>`sum(quantity)`.as('quantity'),
            sql<number>`sum(value_minor)::bigint`.as('value_minor'),
          ])
          .groupBy('part_id')
          .having(sql<string>`sum(quantity)`, '>', '0')
          .as('c'),
      (join) => join.onRef('c.part_id', '=', 'p.id'),
    );
    if (query.q) {
      const pattern = containing(query.q);
      found = found.where(sql<boolean>`(p.code || ' ' || p.name) ilike ${pattern}`);
    }
    const columns = found.select([
      'p.code as part',
      'p.name',
      'p.measure',
      'p.traced',
      'c.quantity',
      'c.value_minor as valueMinor',
    ]);
    const items = await paged(sorted(columns, query.sort, sortColumns, '-value', 'p.id'), query).execute();
    return { items, total: await countOf(found) };
  }

  async totals(handle: Kysely<DB>): Promise<{ readonly shelf: number; readonly accounts: number }> {
    const { rows } = await sql<{ shelf: number; accounts: number }>`
      select (select coalesce(sum(value_minor), 0)::bigint from cost_pool) as shelf,
        (select coalesce(sum(l.debit_minor - l.credit_minor), 0)::bigint
          from journal_line l join account a on a.code = l.account_code and a.is_stock) as accounts`.execute(handle);
    return rows[0] ?? { shelf: 0, accounts: 0 };
  }
}
