import { Injectable } from '@nestjs/common';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import type Stripe from 'stripe';
import { DocumentsService } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { type JobTask, Task } from '../platform/jobs/job-task.js';
import { PaymentServiceClient } from './payment-service.client.js';

interface FeeOfPayment {
  readonly documentId: number;
}

/** Asks what the payments service kept of a payment, and posts it. */
@Injectable()
@Task({ name: 'payment_fee' })
export class PaymentFeeTask implements JobTask<FeeOfPayment> {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly client: PaymentServiceClient,
    private readonly documents: DocumentsService,
    private readonly journal: JournalService,
  ) {}

  async run({ documentId }: FeeOfPayment): Promise<void> {
    const payment = await this.database.handle
      .selectFrom('payment')
      .innerJoin('document', 'document.id', 'payment.document_id')
      .select(['payment.provider_payment_id as intentId', 'document.number'])
      .where('document_id', '=', documentId)
      .executeTakeFirst();
    if (!payment) return;
    const sourceKey = `payment_fee:${payment.number}`;
    const posted = await this.database.handle
      .selectFrom('journal_entry')
      .select('id')
      .where('source_key', '=', sourceKey)
      .executeTakeFirst();
    if (posted) return;
    const fee = feeOf(
      await this.client.stripe.paymentIntents.retrieve(payment.intentId, {
        expand: ['latest_charge.balance_transaction'],
      }),
    );
    // Not settled yet: the queue asks again later.
    if (fee === undefined) throw new Error(`the fee of ${payment.number} is not known yet`);
    await this.transactions.run(async (trx) => {
      const document = await this.documents.record(trx, {
        kind: 'payment',
        recordedBy: null,
        note: `fee of ${payment.number}`,
      });
      await this.journal.post(trx, {
        document,
        event: 'payment_fee',
        sourceKey,
        narrative: `Fee of ${payment.number}`,
        amounts: { fee: minorAmount(fee) },
      });
    });
  }
}

function feeOf(intent: Stripe.PaymentIntent): number | undefined {
  const charge = intent.latest_charge;
  if (charge === null || typeof charge === 'string') return undefined;
  const transaction = charge.balance_transaction;
  return transaction === null || typeof transaction === 'string' ? undefined : transaction.fee;
}
