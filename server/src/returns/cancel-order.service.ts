import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';
import { InvoicingService } from '../invoicing/invoicing.service.js';
import { DocumentsService } from '../journal/documents.service.js';
import { OrderClaimsService } from '../orders/order-claims.service.js';
import { OrdersService, type Order } from '../orders/orders.service.js';
import { ClosePaymentPagesService } from '../payments/close-payment-pages.service.js';
import { RefundsService } from '../payments/refunds.service.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError } from '../platform/errors/app-error.js';
import { Jobs } from '../platform/jobs/jobs.js';
import { PackingService } from '../shipping/packing.service.js';
import { CancellationsRepository } from './cancellations.repository.js';
import type { CancellationDto } from './cancellation.dto.js';

/** Cancels an order that has not left. */
@Injectable()
export class CancelOrderService {
  constructor(
    private readonly transactions: Transactions,
    private readonly audit: Audit,
    private readonly jobs: Jobs,
    private readonly documents: DocumentsService,
    private readonly invoicing: InvoicingService,
    private readonly orders: OrdersService,
    private readonly claims: OrderClaimsService,
    private readonly pages: ClosePaymentPagesService,
    private readonly refunds: RefundsService,
    private readonly packing: PackingService,
    private readonly repository: CancellationsRepository,
  ) {}

  /** @throws AppError `wrong_state` when it has left, is cancelled already, or is just being paid */
  async cancel(orderId: number, reason: string, person: SignedInUser): Promise<CancellationDto> {
    await this.pages.close(orderId);
    return this.transactions.run(async (trx) => {
      const order = await this.orders.lock(trx, orderId);
      await this.refuseTooLate(trx, order);
      await this.packing.dissolve(trx, order);
      const document = await this.documents.record(trx, {
        kind: 'cancellation',
        recordedBy: person.id,
        note: order.number,
      });
      await this.repository.insert(trx, { documentId: document.id, orderId, reason });
      await this.claims.end(trx, orderId);
      await this.audit.record(trx, {
        actor: person,
        action: 'order.cancelled',
        subjectKind: 'sales_order',
        subjectId: orderId,
        subjectCode: order.number,
        after: { reason },
      });
      await this.jobs.add(trx, 'order_cancelled_mail', { orderId });
      return { order: order.number, creditNote: await this.giveBack(trx, order, reason, person) };
    });
  }

  private async refuseTooLate(trx: Transaction<DB>, order: Order): Promise<void> {
    const standing = await this.repository.standing(trx, order.id);
    if (standing.cancelled) throw new AppError('wrong_state', `{order:${order.number}} is cancelled already.`);
    if (standing.shipped) {
      throw new AppError('wrong_state', `{order:${order.number}} has left: it can only come back as a return.`);
    }
  }

  /** @returns the credit note's number; nothing for an order that was not paid */
  private async giveBack(
    trx: Transaction<DB>,
    order: Order,
    reason: string,
    person: SignedInUser,
  ): Promise<string | null> {
    if (!(await this.refunds.isPaid(trx, order.id))) {
      await this.pages.markClosed(trx, order.id);
      return null;
    }
    const invoiceId = await this.repository.invoiceOf(trx, order.id);
    const note = await this.invoicing.credit(trx, { invoiceId, reason, recordedBy: person.id });
    await this.refunds.linkCreditNote(trx, note.invoiceId, order.id);
    await this.refunds.request(trx, { orderId: order.id, creditNoteId: note.invoiceId, requestedBy: person.id });
    return note.number;
  }
}
