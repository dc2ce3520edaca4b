import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';
import { ApplyPaymentService, type ProviderSession } from './apply-payment.service.js';
import { OpenPaymentPageService } from './open-payment-page.service.js';
import { PaymentSessionsRepository } from './payment-sessions.repository.js';

interface PastPayment {
  readonly orderId: number;
  readonly number: string;
  readonly gross: number;
  readonly currency: string;
}

/** Payments of a history that no payments service remembers, brought in by the way every payment takes. */
@Injectable()
export class PastPaymentsService {
  constructor(
    private readonly pages: OpenPaymentPageService,
    private readonly applyPayment: ApplyPaymentService,
    private readonly sessions: PaymentSessionsRepository,
  ) {}

  async record(trx: Transaction<DB>, { orderId, number, gross, currency }: PastPayment): Promise<void> {
    const sessionId = await this.pages.prepare(trx, { id: orderId, gross, currency });
    await this.sessions.setOpen(trx, sessionId, `cs_history_${orderId}`, null);
    const session = await this.sessions.find(trx, sessionId);
    if (!session) throw new Error(`no payment session ${sessionId}`);
    await this.applyPayment.apply(trx, session, paidSession(number, gross, currency, orderId), null);
  }
}

/** What the payments service would have said, as far as the shop reads it. */
function paidSession(number: string, gross: number, currency: string, orderId: number): ProviderSession {
  const seen: Partial<ProviderSession> = {
    id: `cs_history_${orderId}`,
    client_reference_id: number,
    amount_total: gross,
    currency: currency.toLowerCase(),
    payment_status: 'paid',
    status: 'complete',
    payment_intent: `pi_history_${orderId}`,
  };
  return seen as ProviderSession;
}
