import type Stripe from 'stripe';
import { Collection } from './collection.js';
import type { WireEvent, WireLineItem } from './wire.js';

export type IntentData = {
  readonly description: string | null;
  readonly metadata: Readonly<Record<string, string>>;
  readonly receipt_email: string | null;
  readonly statement_descriptor: string | null;
  readonly statement_descriptor_suffix: string | null;
};

/** What a session holds that its answer does not show. */
export type SessionPrivate = {
  readonly id: string;
  readonly lines: readonly WireLineItem[];
  readonly intentData: IntentData;
  /** The card that waits for its holder's confirmation: last digits only, the number is never kept. */
  readonly awaiting: CardOnFile | null;
};

export type CardOnFile = {
  readonly id: string;
  readonly brand: string;
  readonly last4: string;
  readonly funding: string;
  readonly expMonth: number;
  readonly expYear: number;
  readonly holder: string;
  readonly email: string;
};

/** Which payout carried a balance transaction away. */
export type PaidOut = { readonly id: string; readonly payout: string };

/** The first answer to an idempotency key. */
export type KeptAnswer = {
  readonly id: string;
  readonly endpoint: string;
  readonly parameters: string;
  readonly status: number;
  readonly body: unknown;
  readonly request: string;
  readonly retry: boolean | null;
  readonly created: number;
};

export class PaymentsState {
  readonly sessions = new Collection<Stripe.Checkout.Session>();
  readonly sessionPrivates = new Collection<SessionPrivate>();
  readonly intents = new Collection<Stripe.PaymentIntent>();
  readonly charges = new Collection<Stripe.Charge>();
  readonly transactions = new Collection<Stripe.BalanceTransaction>();
  readonly refunds = new Collection<Stripe.Refund>();
  readonly payouts = new Collection<Stripe.Payout>();
  readonly paidOut = new Collection<PaidOut>();
  readonly disputes = new Collection<Stripe.Dispute>();
  readonly events = new Collection<WireEvent>();
  readonly answers = new Collection<KeptAnswer>();

  #collections(): Record<string, Collection<{ readonly id: string }>> {
    const { sessions, sessionPrivates, intents, charges, transactions, refunds, payouts, paidOut, disputes } = this;
    const { events, answers } = this;
    const all = { sessions, sessionPrivates, intents, charges, transactions, refunds, payouts, paidOut, disputes };
    return { ...all, events, answers };
  }

  save(): Record<string, readonly unknown[]> {
    return Object.fromEntries(
      Object.entries(this.#collections()).map(([name, collection]) => [name, collection.oldestFirst()]),
    );
  }

  load(saved: Readonly<Record<string, unknown>>): void {
    for (const [name, collection] of Object.entries(this.#collections())) {
      const things = saved[name] ?? [];
      if (!Array.isArray(things)) throw new Error(`The kept state is damaged: "${name}" is no list.`);
      collection.replaceAll(things as { readonly id: string }[]);
    }
  }

  clear(): void {
    this.load({});
  }
}
