import { Injectable } from '@nestjs/common';
import type { DB, Refund } from '@emberlot/db/database.types';
import type { Selectable, Transaction } from 'kysely';

export type RefundRow = Selectable<Refund>;

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
