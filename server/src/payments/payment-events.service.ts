import { Injectable } from '@nestjs/common';
import type { DB, JsonValue } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';
import type Stripe from 'stripe';
import { Clock } from '../platform/clock/clock.js';
import { Config } from '../platform/config/config.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError } from '../platform/errors/app-error.js';
import { ApplyPaymentService } from './apply-payment.service.js';
import { PaymentSessionsRepository } from './payment-sessions.repository.js';
import { RefundEventsService } from './refund-events.service.js';

/** Takes each event of the payments service once: the event and its effect are one transaction. */
@Injectable()
export class PaymentEventsService {
  constructor(
    private readonly clock: Clock,
    private readonly config: Config,
    private readonly transactions: Transactions,
    private readonly applyPayment: ApplyPaymentService,
    private readonly refunds: RefundEventsService,
    private readonly sessions: PaymentSessionsRepository,
  ) {}

  /**
   * @throws AppError `not_found` for a session we do not know (yet): the sender then tries again
   */
  async receive(event: Stripe.Event): Promise<void> {
    await this.transactions
      .run(async (trx) => {
        const objectId = 'id' in event.data.object ? event.data.object.id : '';
        const kept = {
          id: event.id,
          type: event.type,
          objectId,
          payload: payloadOf(event),
          receivedAt: this.clock.now(),
        };
        if (await this.isKnown(trx, event.id)) return;
        const outcome = await this.effect(trx, event);
        // A parallel copy of the same event waits here for the first and then finds it kept: its effect is rolled back.
        if (!(await this.sessions.keepEvent(trx, { ...kept, outcome }))) throw new AlreadyReceived();
      })
      .catch((error: unknown) => {
        if (!(error instanceof AlreadyReceived)) throw error;
      });
  }

  private async isKnown(trx: Transaction<DB>, id: string): Promise<boolean> {
    const row = await trx
      .selectFrom('payment_event')
      .select('provider_event_id')
      .where('provider_event_id', '=', id)
      .executeTakeFirst();
    return row !== undefined;
  }

  private async effect(trx: Transaction<DB>, event: Stripe.Event): Promise<string> {
    if (event.livemode !== this.config.production) return 'other mode';
    switch (event.type) {
      case 'checkout.session.completed':
      case 'checkout.session.async_payment_succeeded':
      case 'checkout.session.expired':
        return this.session(trx, event.data.object, (session) =>
          this.applyPayment.apply(trx, session, event.data.object, event.id),
        );
      case 'checkout.session.async_payment_failed':
        return this.session(trx, event.data.object, (session) => this.applyPayment.failed(trx, session));
      case 'refund.updated':
      case 'refund.failed':
        return this.refunds.apply(trx, event.data.object);
      default:
        return 'not ours';
    }
  }

  private async session(
    trx: Transaction<DB>,
    seen: Stripe.Checkout.Session,
    act: (session: NonNullable<Awaited<ReturnType<PaymentSessionsRepository['find']>>>) => Promise<string>,
  ): Promise<string> {
    const session = await this.sessions.findByProvider(trx, seen.id);
    if (!session) throw new AppError('not_found', 'There is no payment page of this name yet.');
    return act(session);
  }
}

class AlreadyReceived extends Error {}

function payloadOf(event: Stripe.Event): JsonValue {
  return JSON.parse(JSON.stringify(event)) as JsonValue;
}
