import { Injectable } from '@nestjs/common';
import type { DB, JsonValue, PaymentSession } from '@emberlot/db/database.types';
import type { Kysely, Selectable, Transaction } from 'kysely';

export type PaymentSessionRow = Selectable<PaymentSession>;

export type SessionStatus = 'opening' | 'open' | 'paid' | 'waiting' | 'expired' | 'failed';

@Injectable()
export class PaymentSessionsRepository {
  async insert(
    trx: Transaction<DB>,
    row: { orderId: number; operationKey: string; amount: number; currency: string; expiresAt: Date; createdAt: Date },
  ): Promise<number> {
    const { id } = await trx
      .insertInto('payment_session')
      .values({
        order_id: row.orderId,
        operation_key: row.operationKey,
        amount_minor: row.amount,
        currency: row.currency,
        expires_at: row.expiresAt,
        created_at: row.createdAt,
      })
      .returning('id')
      .executeTakeFirstOrThrow();
    return id;
  }

  async find(handle: Kysely<DB>, id: number): Promise<PaymentSessionRow | undefined> {
    return handle.selectFrom('payment_session').selectAll().where('id', '=', id).executeTakeFirst();
  }

  async findByProvider(handle: Kysely<DB>, providerSessionId: string): Promise<PaymentSessionRow | undefined> {
    return handle
      .selectFrom('payment_session')
      .selectAll()
      .where('provider_session_id', '=', providerSessionId)
      .executeTakeFirst();
  }

  async ofOrder(handle: Kysely<DB>, orderId: number): Promise<PaymentSessionRow[]> {
    return handle.selectFrom('payment_session').selectAll().where('order_id', '=', orderId).orderBy('id').execute();
  }

  /** @returns whether it was one of the expected statuses before */
  async advance(
    trx: Transaction<DB>,
    id: number,
    expected: readonly SessionStatus[],
    status: SessionStatus,
  ): Promise<boolean> {
    const result = await trx
      .updateTable('payment_session')
      .set({ status })
      .where('id', '=', id)
      .where('status', 'in', [...expected])
      .executeTakeFirst();
    return result.numUpdatedRows === 1n;
  }

  async setOpen(trx: Transaction<DB>, id: number, providerSessionId: string, pageUrl: string | null): Promise<void> {
    await trx
      .updateTable('payment_session')
      .set({ status: 'open', provider_session_id: providerSessionId, page_url: pageUrl })
      .where('id', '=', id)
      .where('status', '=', 'opening')
      .execute();
  }

  /** Sessions whose end nobody has told us of, oldest first. */
  async unsettled(handle: Kysely<DB>, before: Date): Promise<PaymentSessionRow[]> {
    return handle
      .selectFrom('payment_session')
      .selectAll()
      .where('status', 'in', ['opening', 'open', 'waiting'])
      .where('created_at', '<', before)
      .orderBy('id')
      .limit(100)
      .execute();
  }

  /** @returns whether this event is new */
  async keepEvent(
    trx: Transaction<DB>,
    event: { id: string; type: string; objectId: string; payload: JsonValue; receivedAt: Date; outcome: string },
  ): Promise<boolean> {
    const row = await trx
      .insertInto('payment_event')
      .values({
        provider_event_id: event.id,
        type: event.type,
        object_id: event.objectId,
        payload: JSON.stringify(event.payload),
        received_at: event.receivedAt,
        outcome: event.outcome,
      })
      .onConflict((conflict) => conflict.column('provider_event_id').doNothing())
      .returning('provider_event_id')
      .executeTakeFirst();
    return row !== undefined;
  }

  async insertPayment(
    trx: Transaction<DB>,
    row: {
      documentId: number;
      orderId: number;
      sessionId: number;
      amount: number;
      currency: string;
      providerPaymentId: string;
      receivedAt: Date;
    },
  ): Promise<void> {
    await trx
      .insertInto('payment')
      .values({
        document_id: row.documentId,
        order_id: row.orderId,
        payment_session_id: row.sessionId,
        amount_minor: row.amount,
        currency: row.currency,
        provider_payment_id: row.providerPaymentId,
        received_at: row.receivedAt,
      })
      .execute();
  }

  async isPaid(handle: Kysely<DB>, orderId: number): Promise<boolean> {
    const row = await handle
      .selectFrom('payment')
      .select('document_id')
      .where('order_id', '=', orderId)
      .executeTakeFirst();
    return row !== undefined;
  }

  async isCancelled(handle: Kysely<DB>, orderId: number): Promise<boolean> {
    const row = await handle
      .selectFrom('order_cancellation')
      .select('document_id')
      .where('order_id', '=', orderId)
      .executeTakeFirst();
    return row !== undefined;
  }

  async insertReview(
    trx: Transaction<DB>,
    review: { orderId: number | null; eventId: string | null; what: string; createdAt: Date },
  ): Promise<void> {
    await trx
      .insertInto('payment_review')
      .values({
        order_id: review.orderId,
        provider_event_id: review.eventId,
        what: review.what,
        created_at: review.createdAt,
      })
      .execute();
  }

  async linkInvoice(trx: Transaction<DB>, invoiceId: number, orderId: number): Promise<void> {
    await trx.insertInto('order_invoice').values({ invoice_id: invoiceId, order_id: orderId }).execute();
  }
}
