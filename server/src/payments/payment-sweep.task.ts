import { Injectable } from '@nestjs/common';
import { OrderClaimsService } from '../orders/order-claims.service.js';
import { OrdersService } from '../orders/orders.service.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { type JobTask, Task } from '../platform/jobs/job-task.js';
import { ApplyPaymentService, type ProviderSession } from './apply-payment.service.js';
import { PaymentServiceClient } from './payment-service.client.js';
import { PaymentSessionsRepository, type PaymentSessionRow } from './payment-sessions.repository.js';

/** An event usually comes within seconds; what is older is asked about. */
const patienceMilliseconds = 2 * 60_000;

/**
 * Re-reads payment pages of which no end was told: events that were lost, pages whose opening was not confirmed to us,
 * orders whose page was never opened.
 */
@Injectable()
@Task({ name: 'payment_sweep', cron: '*/5 * * * *' })
export class PaymentSweepTask implements JobTask {
  constructor(
    private readonly clock: Clock,
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly client: PaymentServiceClient,
    private readonly applyPayment: ApplyPaymentService,
    private readonly claims: OrderClaimsService,
    private readonly orders: OrdersService,
    private readonly sessions: PaymentSessionsRepository,
  ) {}

  async run(): Promise<void> {
    const before = new Date(this.clock.now().getTime() - patienceMilliseconds);
    const faults: unknown[] = [];
    for (const session of await this.sessions.unsettled(this.database.handle, before)) {
      await this.settle(session).catch((error: unknown) => faults.push(error));
    }
    // One page that cannot be read does not keep the others from being settled.
    if (faults.length > 0) throw new AggregateError(faults, `${faults.length} payment pages could not be settled`);
  }

  private async settle(session: PaymentSessionRow): Promise<void> {
    if (session.provider_session_id === null) return this.giveUpUnopened(session);
    const seen = await this.client.stripe.checkout.sessions.retrieve(session.provider_session_id);
    await this.transactions.run(async (trx) => this.applyPayment.apply(trx, session, seen, null));
  }

  /** The call that opened the page was lost, or never made. If the page exists it is found by its order. */
  private async giveUpUnopened(session: PaymentSessionRow): Promise<void> {
    const found = await this.findLost(session);
    if (found) {
      await this.transactions.run(async (trx) => {
        await this.sessions.setOpen(trx, session.id, found.id, found.url);
        await this.applyPayment.apply(trx, session, found, null);
      });
      return;
    }
    if (session.expires_at > this.clock.now()) return;
    await this.transactions.run(async (trx) => {
      await this.orders.lock(trx, session.order_id);
      if (!(await this.sessions.advance(trx, session.id, ['opening'], 'expired'))) return;
      if (!(await this.sessions.isPaid(trx, session.order_id))) await this.claims.end(trx, session.order_id);
    });
  }

  private async findLost(session: PaymentSessionRow): Promise<ProviderSession | undefined> {
    const order = await this.orders.get(this.database.handle, session.order_id);
    const known = new Set(
      (await this.sessions.ofOrder(this.database.handle, session.order_id)).map((row) => row.provider_session_id),
    );
    const created = { gte: Math.floor(session.created_at.getTime() / 1000) - 60 };
    for await (const seen of this.client.stripe.checkout.sessions.list({ created, limit: 100 })) {
      if (seen.client_reference_id === order.number && !known.has(seen.id)) return seen;
    }
    return undefined;
  }
}
