import { Injectable, Logger } from '@nestjs/common';
import { PlaceOrderService } from '../orders/place-order.service.js';
import type { NewOrder, Orderer } from '../orders/new-order.js';
import { OrderClaimsService } from '../orders/order-claims.service.js';
import { OrdersService } from '../orders/orders.service.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError } from '../platform/errors/app-error.js';
import { OpenPaymentPageService } from './open-payment-page.service.js';
import { PaymentSessionsRepository } from './payment-sessions.repository.js';

export interface CheckedOut {
  readonly number: string;
  /** Opens the order for a guest; stands behind `#` in the order's address. */
  readonly guestToken: string;
  /** Nothing when the payments service did not answer: the order waits, and can be paid from its page. */
  readonly paymentPage: string | null;
}

/** From the basket to the payment page: the order first, the outside call after it is committed. */
@Injectable()
export class CheckoutService {
  readonly #log = new Logger(CheckoutService.name);

  constructor(
    private readonly transactions: Transactions,
    private readonly placing: PlaceOrderService,
    private readonly pages: OpenPaymentPageService,
    private readonly claims: OrderClaimsService,
    private readonly orders: OrdersService,
    private readonly sessions: PaymentSessionsRepository,
  ) {}

  async order(orderer: Orderer, order: NewOrder): Promise<CheckedOut> {
    const placed = await this.transactions.run(async (trx) => {
      const made = await this.placing.place(trx, orderer, order);
      const { orderId: id, grossMinor: gross, currency } = made;
      return { ...made, sessionId: await this.pages.prepare(trx, { id, gross, currency }) };
    });
    const { number, guestToken } = placed;
    return { number, guestToken, paymentPage: await this.openPage(placed.sessionId, `/orders/${number}`) };
  }

  /**
   * Opens a payment page again for an order that was not paid, and claims its goods again if they had been given up.
   *
   * @throws AppError `wrong_state` when it is paid or cancelled, `not_enough_stock` when somebody else has the goods now
   */
  async payAgain(orderId: number): Promise<string | null> {
    const { sessionId, path } = await this.transactions.run(async (trx) => {
      const order = await this.orders.lock(trx, orderId);
      if (await this.sessions.isPaid(trx, orderId))
        throw new AppError('wrong_state', `${order.number} is paid already.`);
      if (await this.sessions.isCancelled(trx, orderId))
        throw new AppError('wrong_state', `${order.number} is cancelled.`);
      const path = `/orders/${order.number}`;
      const all = await this.sessions.ofOrder(trx, orderId);
      const running = all.find(({ status }) => status === 'open' || status === 'opening' || status === 'waiting');
      if (running) return { sessionId: running.id, path };
      const short = await this.claims.makeLasting(trx, orderId);
      if (short.length > 0) {
        throw new AppError(
          'not_enough_stock',
          'Somebody else has bought what this order needed. Order again to see what is there.',
        );
      }
      const { id, gross_minor: gross, currency } = order;
      const sessionId = await this.pages.prepare(trx, { id, gross, currency });
      await this.claims.hold(trx, orderId);
      return { sessionId, path };
    });
    return this.openPage(sessionId, path);
  }

  private async openPage(sessionId: number, orderPath: string): Promise<string | null> {
    try {
      return await this.pages.open(sessionId, { orderPath });
    } catch (error) {
      // The order stands; the buyer is told, can try again, and the sweeper looks after the rest.
      this.#log.warn(`payment page of session ${sessionId} could not be opened: ${String(error)}`);
      return null;
    }
  }
}
