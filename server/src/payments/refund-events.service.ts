import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import type { Transaction } from 'kysely';
import type Stripe from 'stripe';
import { DocumentsService } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { Clock } from '../platform/clock/clock.js';
import { RefundsRepository } from './refunds.repository.js';

/** What became of money on its way back to a buyer. Decided by the refund's state, once each. */
@Injectable()
export class RefundEventsService {
  constructor(
    private readonly clock: Clock,
    private readonly documents: DocumentsService,
    private readonly journal: JournalService,
    private readonly refunds: RefundsRepository,
  ) {}

  async apply(trx: Transaction<DB>, seen: Stripe.Refund): Promise<string> {
    const refund = await this.refunds.lockByProvider(trx, seen.id);
    if (!refund) return 'not ours';
    if (seen.status !== 'failed' && seen.status !== 'canceled') return 'under way';
    if (refund.status === 'failed') return 'known';
    await this.refunds.setStatus(trx, refund.id, 'failed', this.clock.now());
    if (refund.status === 'sent') {
      // The entry of the refund is taken back by one with its sides swapped; the first stays as it was.
      const document = await this.documents.record(trx, {
        kind: 'refund',
        recordedBy: null,
        note: 'refused by the bank',
      });
      await this.journal.post(trx, {
        document,
        event: 'refund_sent',
        narrative: 'The bank refused the refund',
        amounts: { gross: minorAmount(-refund.amount_minor) },
      });
    }
    await this.refunds.reviewFailed(trx, refund.order_id, this.clock.now());
    return 'failed';
  }
}
