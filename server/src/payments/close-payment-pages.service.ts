import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';
import Stripe from 'stripe';
import { Database } from '../platform/database/database.js';
import { AppError } from '../platform/errors/app-error.js';
import { PaymentServiceClient } from './payment-service.client.js';
import { PaymentSessionsRepository } from './payment-sessions.repository.js';

/** Makes sure that nobody can pay any more for an order that is about to be cancelled. */
@Injectable()
export class ClosePaymentPagesService {
  constructor(
    private readonly database: Database,
    private readonly client: PaymentServiceClient,
    private readonly sessions: PaymentSessionsRepository,
  ) {}

  /**
   * Ends the open payment pages of an order at the payments service. Called before the transaction.
   *
   * @throws AppError `wrong_state` while a payment is under way
   */
  async close(orderId: number): Promise<void> {
    if (await this.sessions.isPaid(this.database.handle, orderId)) return;
    for (const session of await this.sessions.ofOrder(this.database.handle, orderId)) {
      if (session.status === 'waiting') throw underWay();
      if (session.status !== 'open' || session.provider_session_id === null) continue;
      await this.expire(session.provider_session_id);
    }
  }

  /** Writes down that the pages are closed, in the transaction of the cancellation. */
  async markClosed(trx: Transaction<DB>, orderId: number): Promise<void> {
    for (const session of await this.sessions.ofOrder(trx, orderId)) {
      if (session.status === 'waiting') throw underWay();
      await this.sessions.advance(trx, session.id, ['opening', 'open'], 'expired');
    }
  }

  private async expire(providerSessionId: string): Promise<void> {
    const seen = await this.client.stripe.checkout.sessions.retrieve(providerSessionId);
    if (seen.status === 'expired') return;
    if (seen.status === 'complete') throw underWay();
    try {
      await this.client.stripe.checkout.sessions.expire(providerSessionId);
    } catch (error) {
      // Somebody pressed the button in the same moment.
      if (error instanceof Stripe.errors.StripeInvalidRequestError) throw underWay();
      throw error;
    }
  }
}

function underWay(): AppError {
  return new AppError('wrong_state', 'A payment for this order is just under way. Try again when its outcome is here.');
}
