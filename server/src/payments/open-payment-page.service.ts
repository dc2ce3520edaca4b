import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';
import type Stripe from 'stripe';
import { OrdersService } from '../orders/orders.service.js';
import { Clock } from '../platform/clock/clock.js';
import { Config } from '../platform/config/config.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { PaymentServiceClient } from './payment-service.client.js';
import { PaymentSessionsRepository, type PaymentSessionRow } from './payment-sessions.repository.js';

/** The page lives for as long as the payments service allows at least; claims live longer. */
const pageMinutes = 31;

/** Opens the hosted payment page for an order, after the order is committed. */
@Injectable()
export class OpenPaymentPageService {
  constructor(
    private readonly clock: Clock,
    private readonly config: Config,
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly client: PaymentServiceClient,
    private readonly orders: OrdersService,
    private readonly sessions: PaymentSessionsRepository,
  ) {}

  /** Writes down that a page is to be opened, in the transaction of the order. */
  async prepare(trx: Transaction<DB>, order: { id: number; gross: number; currency: string }): Promise<number> {
    const createdAt = this.clock.now();
    return this.sessions.insert(trx, {
      orderId: order.id,
      operationKey: randomUUID(),
      amount: order.gross,
      currency: order.currency,
      expiresAt: new Date(createdAt.getTime() + pageMinutes * 60_000),
      createdAt,
    });
  }

  /**
   * Asks the payments service for the page. The stored key lets the call be repeated without a second page.
   *
   * @param access what the buyer's browser needs to come back to the order
   * @returns the page's address
   * @throws whatever the payments service answers; the session then stays `opening`
   */
  async open(sessionId: number, access: { orderPath: string }): Promise<string | null> {
    const session = await this.sessions.find(this.database.handle, sessionId);
    if (!session) throw new Error(`no payment session ${sessionId}`);
    if (session.page_url !== null) return session.page_url;
    const created = await this.client.stripe.checkout.sessions.create(await this.request(session, access), {
      idempotencyKey: session.operation_key,
    });
    await this.transactions.run(async (trx) => this.sessions.setOpen(trx, session.id, created.id, created.url));
    return created.url;
  }

  private async request(
    session: PaymentSessionRow,
    access: { orderPath: string },
  ): Promise<Stripe.Checkout.SessionCreateParams> {
    const order = await this.orders.get(this.database.handle, session.order_id);
    const back = `${this.config.baseUrl}${access.orderPath}`;
    return {
      mode: 'payment',
      client_reference_id: order.number,
      customer_email: order.email,
      metadata: { order: order.number },
      line_items: [
        {
          quantity: 1,
          price_data: {
            currency: session.currency.toLowerCase(),
            unit_amount: session.amount_minor,
            product_data: { name: `Order ${order.number}` },
          },
        },
      ],
      expires_at: Math.floor(session.expires_at.getTime() / 1000),
      success_url: back,
      cancel_url: back,
    };
  }
}
