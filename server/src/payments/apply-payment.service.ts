import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import type { Transaction } from 'kysely';
import type Stripe from 'stripe';
import { InvoicingService } from '../invoicing/invoicing.service.js';
import { DocumentsService } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { OrderClaimsService } from '../orders/order-claims.service.js';
import { orderInvoiceDraft } from '../orders/order-invoice-draft.js';
import { OrdersService, type Order } from '../orders/orders.service.js';
import { Clock } from '../platform/clock/clock.js';
import { Jobs } from '../platform/jobs/jobs.js';
import { PaymentSessionsRepository, type PaymentSessionRow } from './payment-sessions.repository.js';

/** What the payments service says of one of its sessions, by an event or when it is asked. */
export type ProviderSession = Stripe.Checkout.Session;

/**
 * Brings our state in line with that of a session at the payments service. Decides by the session's state and never by
 * which event came when, so that events may come late, twice or in any order.
 */
@Injectable()
export class ApplyPaymentService {
  constructor(
    private readonly clock: Clock,
    private readonly jobs: Jobs,
    private readonly documents: DocumentsService,
    private readonly journal: JournalService,
    private readonly invoicing: InvoicingService,
    private readonly claims: OrderClaimsService,
    private readonly orders: OrdersService,
    private readonly sessions: PaymentSessionsRepository,
  ) {}

  /**
   * @param eventId the event that told it; nothing when the sweeper asked
   * @returns what was done, for the record
   */
  async apply(trx: Transaction<DB>, session: PaymentSessionRow, seen: ProviderSession, eventId: string | null) {
    const order = await this.orders.lock(trx, session.order_id);
    const current = await this.sessions.find(trx, session.id);
    if (!current || current.status === 'paid') return 'known';
    const misfit = misfitOf(order, current, seen);
    if (misfit !== undefined) return this.review(trx, order, eventId, misfit);
    if (seen.payment_status === 'paid') return this.paid(trx, order, current, seen, eventId);
    if (seen.status === 'expired') return this.expired(trx, order, current);
    if (seen.status === 'complete') {
      await this.sessions.advance(trx, current.id, ['opening', 'open'], 'waiting');
      await this.claims.extend(trx, order.id, new Date(this.clock.now().getTime() + 14 * 86_400_000));
      return 'waiting';
    }
    return 'open';
  }

  /** The bank refused a payment that had been waiting: the goods are free again. */
  async failed(trx: Transaction<DB>, session: PaymentSessionRow): Promise<string> {
    const order = await this.orders.lock(trx, session.order_id);
    if (!(await this.sessions.advance(trx, session.id, ['opening', 'open', 'waiting'], 'failed'))) return 'known';
    await this.releaseUnlessPaid(trx, order.id);
    return 'failed';
  }

  private async paid(
    trx: Transaction<DB>,
    order: Order,
    session: PaymentSessionRow,
    seen: ProviderSession,
    eventId: string | null,
  ): Promise<string> {
    const twice = await this.sessions.isPaid(trx, order.id);
    if (twice)
      return this.review(trx, order, eventId, `${order.number} was paid a second time: give the second payment back.`);
    if (await this.sessions.isCancelled(trx, order.id)) {
      return this.review(
        trx,
        order,
        eventId,
        `${order.number} was paid after it had been cancelled: give the payment back.`,
      );
    }
    await this.sessions.advance(trx, session.id, ['opening', 'open', 'waiting', 'expired', 'failed'], 'paid');
    const missing = await this.claims.makeLasting(trx, order.id);
    if (missing.length > 0) {
      await this.review(
        trx,
        order,
        null,
        `${order.number} was paid when its claim had run out, and ${missing.join(', ')} is short.`,
      );
    }
    await this.recordPayment(trx, order, session, seen);
    await this.invoice(trx, order);
    return 'paid';
  }

  private async recordPayment(
    trx: Transaction<DB>,
    order: Order,
    session: PaymentSessionRow,
    seen: ProviderSession,
  ): Promise<void> {
    const document = await this.documents.record(trx, { kind: 'payment', recordedBy: null, note: order.number });
    const providerPaymentId = idOf(seen.payment_intent) ?? seen.id;
    await this.sessions.insertPayment(trx, {
      documentId: document.id,
      orderId: order.id,
      sessionId: session.id,
      amount: session.amount_minor,
      currency: session.currency,
      providerPaymentId,
      receivedAt: this.clock.now(),
    });
    await this.journal.post(trx, {
      document,
      event: 'payment_received',
      narrative: `Payment of ${order.number}`,
      amounts: { gross: minorAmount(session.amount_minor) },
    });
    await this.jobs.add(trx, 'payment_fee', { documentId: document.id });
  }

  private async invoice(trx: Transaction<DB>, order: Order): Promise<void> {
    const lines = await this.orders.lines(trx, order.id);
    const issued = await this.invoicing.issue(trx, orderInvoiceDraft(order, lines));
    await this.sessions.linkInvoice(trx, issued.invoiceId, order.id);
    await this.jobs.add(trx, 'order_paid_mail', { orderId: order.id, invoiceId: issued.invoiceId });
  }

  private async expired(trx: Transaction<DB>, order: Order, session: PaymentSessionRow): Promise<string> {
    if (!(await this.sessions.advance(trx, session.id, ['opening', 'open'], 'expired'))) return 'known';
    await this.releaseUnlessPaid(trx, order.id);
    return 'expired';
  }

  /** A later page of the same order may be open or paid: then its goods stay claimed. */
  private async releaseUnlessPaid(trx: Transaction<DB>, orderId: number): Promise<void> {
    if (await this.sessions.isPaid(trx, orderId)) return;
    const others = await this.sessions.ofOrder(trx, orderId);
    if (others.some(({ status }) => status === 'open' || status === 'opening' || status === 'waiting')) return;
    await this.claims.end(trx, orderId);
  }

  private async review(trx: Transaction<DB>, order: Order, eventId: string | null, what: string): Promise<string> {
    await this.sessions.insertReview(trx, { orderId: order.id, eventId, what, createdAt: this.clock.now() });
    return 'review';
  }
}

/** Why a session does not fit its order, in a sentence for the owner; nothing when it does. */
function misfitOf(order: Order, session: PaymentSessionRow, seen: ProviderSession): string | undefined {
  if (seen.client_reference_id !== order.number) {
    return `A payment names ${String(seen.client_reference_id)}, but its page was opened for ${order.number}.`;
  }
  if (seen.amount_total !== session.amount_minor || session.amount_minor !== order.gross_minor) {
    return `A payment of ${String(seen.amount_total)} came for ${order.number}, which costs ${order.gross_minor} (minor units).`;
  }
  if (seen.currency?.toUpperCase() !== session.currency) {
    return `A payment in ${String(seen.currency)} came for ${order.number}, which is in ${session.currency}.`;
  }
  return undefined;
}

function idOf(reference: string | { readonly id: string } | null): string | undefined {
  return typeof reference === 'string' ? reference : reference?.id;
}
