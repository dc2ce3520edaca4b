import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';

export interface PartFiguresRow {
  readonly partId: number;
  readonly held: string;
  readonly bins: string[];
  readonly poolQuantity: string;
  readonly valueMinor: number;
  /** What left for batches and buyers since the given instant. */
  readonly used: string;
}

/** What a list shows of parts besides their availability, for the parts of one page. */
@Injectable()
export class PartFiguresRepository {
  async read(handle: Kysely<DB>, partIds: readonly number[], usedSince: Date): Promise<PartFiguresRow[]> {
    if (partIds.length === 0) return [];
    const { rows } = await sql<PartFiguresRow>`
      select p.id as "partId", lying.held, lying.bins, pool.quantity as "poolQuantity", pool.value as "valueMinor",
        moved.used
      from unnest(${[...partIds]}::bigint[]) as p (id)
      left join lateral (
        select coalesce(sum(b.quantity) filter (where l.status = 'held'), 0) as held,
          coalesce(array_agg(distinct bin.code), '{}') as bins
        from stock_balance b join lot l on l.id = b.lot_id join bin on bin.id = b.bin_id
        where b.part_id = p.id and b.quantity > 0 and b.owner_customer_id is null
      ) lying on true
      left join lateral (
        select coalesce(sum(c.quantity), 0) as quantity, coalesce(sum(c.value_minor), 0)::bigint as value
        from cost_pool c where c.part_id = p.id
      ) pool on true
      left join lateral (
        select coalesce(-sum(m.quantity), 0) as used from stock_move m
        where m.part_id = p.id and m.reason in ('issue', 'issue_return', 'dispatch') and m.occurred_at >= ${usedSince}
      ) moved on true`.execute(handle);
    return rows;
  }
}
