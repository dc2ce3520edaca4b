import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';

export interface OrderNeedRow {
  readonly id: number;
  readonly orderLineId: number;
  readonly demandId: number;
  readonly partId: number;
  readonly partCode: string;
  readonly quantity: string;
  readonly bag: string | null;
  /** Held by claims that have not ended. */
  readonly claimed: string;
}

@Injectable()
export class OrderNeedsRepository {
  async ofOrder(handle: Kysely<DB>, orderId: number): Promise<OrderNeedRow[]> {
    return handle
      .selectFrom('order_line_need as n')
      .innerJoin('order_line as l', 'l.id', 'n.order_line_id')
      .innerJoin('part as p', 'p.id', 'n.part_id')
      .select([
        'n.id',
        'n.order_line_id as orderLineId',
        'n.demand_id as demandId',
        'n.part_id as partId',
        'p.code as partCode',
        'n.quantity',
        'n.bag',
        sql<string>`(select coalesce(sum(r.quantity), 0) from reservation r
                     where r.demand_id = n.demand_id and r.ended_at is null)`.as('claimed'),
      ])
      .where('l.order_id', '=', orderId)
      .orderBy('n.id')
      .execute();
  }

  /** A payment came after all: the demands stand again. */
  async reopen(trx: Transaction<DB>, demandIds: readonly number[]): Promise<void> {
    if (demandIds.length === 0) return;
    await trx
      .updateTable('demand')
      .set({ closed_at: null })
      .where('id', 'in', [...demandIds])
      .whereRef('taken', '<', 'quantity')
      .execute();
  }

  /** Claims past their instant no longer hold: somebody else may have what they held. */
  async endRunOut(trx: Transaction<DB>, demandIds: readonly number[], at: Date): Promise<void> {
    if (demandIds.length === 0) return;
    await trx
      .updateTable('reservation')
      .set({ ended_at: at, end_reason: 'expired' })
      .where('demand_id', 'in', [...demandIds])
      .where('ended_at', 'is', null)
      .where('expires_at', '<=', at)
      .execute();
  }
}
