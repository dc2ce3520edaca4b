import { Injectable } from '@nestjs/common';
import type { DB, Refund } from '@emberlot/db/database.types';
import type { Kysely, Selectable, Transaction } from 'kysely';

export type RefundRow = Selectable<Refund>;

export interface RefundToSend {
  readonly amount: number;
  readonly operationKey: string;
  readonly status: string;
  readonly paymentIntentId: string;
  readonly orderNumber: string;
}

@Injectable()
export class RefundsRepository {
  async lockByProvider(trx: Transaction<DB>, providerRefundId: string): Promise<RefundRow | undefined> {
    return trx
      .selectFrom('refund')
      .selectAll()
      .where('provider_refund_id', '=', providerRefundId)
      .forUpdate()
      .executeTakeFirst();
  }

  async paymentOf(trx: Transaction<DB>, orderId: number) {
    return trx
      .selectFrom('payment')
      .select(['document_id as documentId', 'amount_minor as amount'])
      .where('order_id', '=', orderId)
      .executeTakeFirst();
  }

  async insert(
    trx: Transaction<DB>,
    row: {
      documentId: number;
      orderId: number;
      paymentDocumentId: number;
      creditNoteId: number;
      amount: number;
      operationKey: string;
      requestedAt: Date;
      requestedBy: number;
    },
  ): Promise<number> {
    const { id } = await trx
      .insertInto('refund')
      .values({
        document_id: row.documentId,
        order_id: row.orderId,
        payment_document_id: row.paymentDocumentId,
        credit_note_id: row.creditNoteId,
        amount_minor: row.amount,
        operation_key: row.operationKey,
        requested_at: row.requestedAt,
        requested_by: row.requestedBy,
      })
      .returning('id')
      .executeTakeFirstOrThrow();
    return id;
  }

  async toSend(handle: Kysely<DB>, id: number): Promise<RefundToSend | undefined> {
    return handle
      .selectFrom('refund as r')
      .innerJoin('payment as p', 'p.document_id', 'r.payment_document_id')
      .innerJoin('sales_order as o', 'o.id', 'r.order_id')
      .select([
        'r.amount_minor as amount',
        'r.operation_key as operationKey',
        'r.status',
        'p.provider_payment_id as paymentIntentId',
        'o.number as orderNumber',
      ])
      .where('r.id', '=', id)
      .executeTakeFirst();
  }

  async lock(trx: Transaction<DB>, id: number): Promise<RefundRow> {
    return trx.selectFrom('refund').selectAll().where('id', '=', id).forUpdate().executeTakeFirstOrThrow();
  }

  async setSent(trx: Transaction<DB>, id: number, providerRefundId: string, settledAt: Date): Promise<void> {
    await trx
      .updateTable('refund')
      .set({ status: 'sent', provider_refund_id: providerRefundId, settled_at: settledAt })
      .where('id', '=', id)
      .execute();
  }

  async setStatus(trx: Transaction<DB>, id: number, status: 'sent' | 'failed', settledAt: Date): Promise<void> {
    await trx.updateTable('refund').set({ status, settled_at: settledAt }).where('id', '=', id).execute();
  }

  async reviewFailed(trx: Transaction<DB>, orderId: number, createdAt: Date): Promise<void> {
    await trx
      .insertInto('payment_review')
      .values({
        order_id: orderId,
        what: 'The bank refused the refund. Ask the buyer for another way to give the money back.',
        created_at: createdAt,
      })
      .execute();
  }
}
