import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';
import { DocumentsService } from '../journal/documents.service.js';
import { Clock } from '../platform/clock/clock.js';
import { Jobs } from '../platform/jobs/jobs.js';
import { PaymentSessionsRepository } from './payment-sessions.repository.js';
import { RefundsRepository } from './refunds.repository.js';

/** Money that goes back to a buyer: written down with its credit note, sent after the commit. */
@Injectable()
export class RefundsService {
  constructor(
    private readonly clock: Clock,
    private readonly jobs: Jobs,
    private readonly documents: DocumentsService,
    private readonly sessions: PaymentSessionsRepository,
    private readonly repository: RefundsRepository,
  ) {}

  /** Whether an order has been paid. The caller holds its lock. */
  async isPaid(trx: Transaction<DB>, orderId: number): Promise<boolean> {
    return this.sessions.isPaid(trx, orderId);
  }

  /** The credit note belongs to the order from now on. */
  async linkCreditNote(trx: Transaction<DB>, creditNoteId: number, orderId: number): Promise<void> {
    await this.sessions.linkInvoice(trx, creditNoteId, orderId);
  }

  /** Asks for the whole payment of an order to go back; the caller holds the order's lock. */
  async request(
    trx: Transaction<DB>,
    refund: { readonly orderId: number; readonly creditNoteId: number; readonly requestedBy: number },
  ): Promise<void> {
    const payment = await this.repository.paymentOf(trx, refund.orderId);
    if (!payment) throw new Error(`order ${refund.orderId} has no payment to give back`);
    const document = await this.documents.record(trx, { kind: 'refund', recordedBy: refund.requestedBy });
    const refundId = await this.repository.insert(trx, {
      documentId: document.id,
      orderId: refund.orderId,
      paymentDocumentId: payment.documentId,
      creditNoteId: refund.creditNoteId,
      amount: payment.amount,
      operationKey: randomUUID(),
      requestedAt: this.clock.now(),
      requestedBy: refund.requestedBy,
    });
    await this.jobs.add(trx, 'send_refund', { refundId }, { jobKey: `send_refund ${refundId}` });
  }
}
