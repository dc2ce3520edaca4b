import type Stripe from 'stripe';
import { feeOf } from './currency.js';
import { identifier } from './identifier.js';
import type { World } from './world.js';

const SECONDS_UNTIL_AVAILABLE = 2 * 24 * 3600;

type Entry = {
  readonly type: Stripe.BalanceTransaction['type'];
  readonly category: string;
  readonly amount: number;
  readonly fee: number;
  readonly feeText?: string;
  readonly currency: string;
  readonly source: string;
  readonly description: string | null;
  readonly available?: boolean;
};

/** Adds a movement of the balance; net is amount less fee. */
export function post(world: World, entry: Entry): Stripe.BalanceTransaction {
  const now = world.now();
  const { amount, fee, currency } = entry;
  const transaction = {
    id: identifier('txn_'),
    object: 'balance_transaction',
    amount,
    available_on: entry.available ? now : now + SECONDS_UNTIL_AVAILABLE,
    balance_type: 'payments',
    created: now,
    currency,
    description: entry.description,
    exchange_rate: null,
    fee,
    fee_details:
      fee === 0
        ? []
        : [
            {
              amount: fee,
              application: null,
              currency,
              description: entry.feeText ?? 'Processing fee',
              type: 'stripe_fee',
            },
          ],
    net: amount - fee,
    reporting_category: entry.category,
    source: entry.source,
    status: entry.available ? 'available' : 'pending',
    type: entry.type,
  } satisfies Stripe.BalanceTransaction;
  return world.state.transactions.add(transaction);
}

export function postCharge(world: World, charge: Stripe.Charge): Stripe.BalanceTransaction {
  const { amount, currency, id: source, description } = charge;
  const fee = feeOf(amount, currency);
  return post(world, { type: 'charge', category: 'charge', amount, fee, currency, source, description });
}

/** Money becomes available with time; the stored status follows the clock. */
export function settleAvailability(world: World): void {
  for (const { id, status, available_on } of world.state.transactions.oldestFirst()) {
    if (status === 'pending' && available_on <= world.now()) {
      world.state.transactions.change(id, { status: 'available' });
    }
  }
}

export function balance(world: World): Stripe.Balance {
  settleAvailability(world);
  const sums = (status: string) => {
    const byCurrency = new Map<string, number>();
    for (const transaction of world.state.transactions.oldestFirst()) {
      const sum = byCurrency.get(transaction.currency) ?? 0;
      byCurrency.set(transaction.currency, sum + (transaction.status === status ? transaction.net : 0));
    }
    return Array.from(byCurrency, ([currency, amount]) => ({ amount, currency, source_types: { card: amount } }));
  };
  return {
    object: 'balance',
    available: sums('available'),
    livemode: false,
    pending: sums('pending'),
  } satisfies Stripe.Balance;
}
