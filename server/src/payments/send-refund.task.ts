import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import type { Transaction } from 'kysely';
import Stripe from 'stripe';
import { DocumentsService } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { type JobTask, Task } from '../platform/jobs/job-task.js';
import { PaymentServiceClient } from './payment-service.client.js';
import { RefundEventsService } from './refund-events.service.js';
import { RefundsRepository, type RefundToSend } from './refunds.repository.js';

interface RefundJob {
  readonly refundId: number;
}

/**
 * Sends a refund. The stored key makes a repeated call the same refund; the entry is posted once, under the refund's
 * own document.
 */
@Injectable()
@Task({ name: 'send_refund' })
export class SendRefundTask implements JobTask<RefundJob> {
  constructor(
    private readonly clock: Clock,
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly client: PaymentServiceClient,
    private readonly documents: DocumentsService,
    private readonly journal: JournalService,
    private readonly events: RefundEventsService,
    private readonly refunds: RefundsRepository,
  ) {}

  async run({ refundId }: RefundJob): Promise<void> {
    const refund = await this.refunds.toSend(this.database.handle, refundId);
    if (!refund || refund.status !== 'requested') return;
    const created = await this.create(refund);
    if (created === undefined) {
      await this.transactions.run(async (trx) => this.refused(trx, refundId));
      return;
    }
    await this.transactions.run(async (trx) => this.sent(trx, refundId, created.id));
    // An event that told of a failure before the refund's name was kept here found nothing: so its state is read again.
    const seen = await this.client.stripe.refunds.retrieve(created.id);
    await this.transactions.run(async (trx) => {
      await this.events.apply(trx, seen);
    });
  }

  /** @returns nothing when the payments service refuses for good: a person has to look */
  private async create(refund: RefundToSend): Promise<Stripe.Refund | undefined> {
    try {
      return await this.client.stripe.refunds.create(
        {
          payment_intent: refund.paymentIntentId,
          amount: refund.amount,
          metadata: { order: refund.orderNumber },
        },
        { idempotencyKey: refund.operationKey },
      );
    } catch (error) {
      if (error instanceof Stripe.errors.StripeInvalidRequestError) return undefined;
      throw error;
    }
  }

  private async sent(trx: Transaction<DB>, refundId: number, providerRefundId: string): Promise<void> {
    const refund = await this.refunds.lock(trx, refundId);
    if (refund.status !== 'requested') return;
    await this.refunds.setSent(trx, refundId, providerRefundId, this.clock.now());
    const document = await this.documents.get(trx, refund.document_id);
    await this.journal.post(trx, {
      document,
      event: 'refund_sent',
      narrative: `Refund ${document.number}`,
      amounts: { gross: minorAmount(refund.amount_minor) },
    });
  }

  private async refused(trx: Transaction<DB>, refundId: number): Promise<void> {
    const refund = await this.refunds.lock(trx, refundId);
    if (refund.status !== 'requested') return;
    await this.refunds.setStatus(trx, refundId, 'failed', this.clock.now());
    await this.refunds.reviewFailed(trx, refund.order_id, this.clock.now());
  }
}
