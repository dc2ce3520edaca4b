import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';

export interface PartCostRow {
  readonly partId: number;
  /** Of all pools of the part that hold something. */
  readonly quantity: string;
  readonly valueMinor: number;
  /** Major units per stock unit of what came in last; nothing when nothing ever came. */
  readonly lastCost: string | null;
}

/** What parts cost today: read from the shelf's pools and moves. */
@Injectable()
export class PartCostsRepository {
  async read(handle: Kysely<DB>, partIds: readonly number[]): Promise<PartCostRow[]> {
    if (partIds.length === 0) return [];
    return handle
      .selectFrom('part')
      .where('part.id', 'in', [...partIds])
      .select(['part.id as partId'])
      .select(
        sql<string>`coalesce((select sum(c.quantity) from cost_pool c where c.part_id = part.id), 0)`.as('quantity'),
      )
      .select(
        sql<number>`coalesce((select sum(c.value_minor) from cost_pool c where c.part_id = part.id), 0)::int8`.as(
          'valueMinor',
        ),
      )
      .select(
        sql<string | null>`(
          select m.unit_cost from stock_move m
          where m.part_id = part.id and m.reason in ('opening', 'receipt', 'completion') and m.quantity > 0
          order by m.id desc limit 1
        )`.as('lastCost'),
      )
      .execute();
  }
}
