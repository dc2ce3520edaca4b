import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';

@Injectable()
export class CancellationsRepository {
  async insert(
    trx: Transaction<DB>,
    cancellation: { documentId: number; orderId: number; reason: string },
  ): Promise<void> {
    await trx
      .insertInto('order_cancellation')
      .values({
        document_id: cancellation.documentId,
        order_id: cancellation.orderId,
        reason: cancellation.reason,
      })
      .execute();
  }

  /** Read under the order's lock. */
  async standing(
    handle: Kysely<DB>,
    orderId: number,
  ): Promise<{ readonly cancelled: boolean; readonly shipped: boolean }> {
    const { rows } = await sql<{ cancelled: boolean; shipped: boolean }>`
      select exists (select 1 from order_cancellation where order_id = ${orderId}) as cancelled,
             exists (select 1 from shipment where order_id = ${orderId} and status = 'shipped') as shipped
    `.execute(handle);
    const [row] = rows;
    if (!row) throw new Error('the standing of an order could not be read');
    return row;
  }

  /** The invoice of a paid order; there is exactly one. */
  async invoiceOf(handle: Kysely<DB>, orderId: number): Promise<number> {
    const row = await handle
      .selectFrom('order_invoice as o')
      .innerJoin('invoice as i', 'i.id', 'o.invoice_id')
      .select('i.id')
      .where('o.order_id', '=', orderId)
      .where('i.kind', '=', 'invoice')
      .executeTakeFirstOrThrow();
    return row.id;
  }

  async cancellationOf(handle: Kysely<DB>, orderId: number) {
    return handle
      .selectFrom('order_cancellation as c')
      .leftJoin('refund as r', 'r.order_id', 'c.order_id')
      .leftJoin('invoice as i', 'i.id', 'r.credit_note_id')
      .select(['c.reason', 'r.amount_minor as refunded', 'i.id as creditNoteId', 'i.number as creditNote'])
      .where('c.order_id', '=', orderId)
      .executeTakeFirst();
  }
}
