import type Stripe from 'stripe';
import { Refusal } from '../http/exchange.js';
import { post } from './balance.js';
import { identifier } from './identifier.js';
import { emit, type World } from './world.js';

/** Pays out everything of a currency that no payout has carried yet, fees and refunds taken off. */
export function createPayout(world: World, currency: string, arrivesAt: number): Stripe.Payout {
  const carried = world.state.transactions
    .oldestFirst()
    .filter((transaction) => transaction.currency === currency && !world.state.paidOut.find(transaction.id));
  const amount = carried.reduce((sum, transaction) => sum + transaction.net, 0);
  if (amount <= 0) throw new Refusal(409, `There is nothing to pay out in ${currency}.`);
  const id = identifier('po_');
  const transaction = post(world, {
    type: 'payout',
    category: 'payout',
    amount: -amount,
    fee: 0,
    currency,
    source: id,
    description: 'Payout',
    available: true,
  });
  for (const { id: moved } of [...carried, transaction]) world.state.paidOut.add({ id: moved, payout: id });
  const payout = world.state.payouts.add({
    id,
    object: 'payout',
    amount,
    application_fee: null,
    application_fee_amount: null,
    arrival_date: arrivesAt,
    automatic: true,
    balance_transaction: transaction.id,
    created: world.now(),
    currency,
    description: 'Payout',
    destination: null,
    failure_balance_transaction: null,
    failure_code: null,
    failure_message: null,
    livemode: false,
    metadata: {},
    method: 'standard',
    original_payout: null,
    payout_method: null,
    reconciliation_status: 'completed',
    reversed_by: null,
    source_type: 'card',
    statement_descriptor: null,
    status: 'paid',
    trace_id: { status: 'supported', value: identifier('', 16) },
    type: 'bank_account',
  } satisfies Stripe.Payout);
  emit(world, 'payout.created', { ...payout, status: 'in_transit' });
  emit(world, 'payout.paid', payout);
  emit(world, 'payout.reconciliation_completed', payout);
  return payout;
}

/** The bank sent a payout back: its money returns to the balance, for the next one. */
export function failPayout(world: World, payout: Stripe.Payout, code: string): Stripe.Payout {
  const transaction = post(world, {
    type: 'payout_failure',
    category: 'payout_reversal',
    amount: payout.amount,
    fee: 0,
    currency: payout.currency,
    source: payout.id,
    description: 'Payout failed',
    available: true,
  });
  const failed = world.state.payouts.change(payout.id, {
    status: 'failed',
    failure_code: code,
    failure_message: 'The bank account did not take the payout.',
    failure_balance_transaction: transaction.id,
  });
  emit(world, 'payout.failed', failed);
  return failed;
}
