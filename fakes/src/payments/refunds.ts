import type Stripe from 'stripe';
import { badParameter, missingParameter, noSuch, refused } from './api-error.js';
import { post } from './balance.js';
import { moneyText } from './currency.js';
import { identifier } from './identifier.js';
import type { Parameters } from './parameters.js';
import { idOf } from './wire.js';
import { emit, NO_CAUSE, type Cause, type World } from './world.js';

const REASONS = ['duplicate', 'fraudulent', 'requested_by_customer'] as const;

export function createRefund(world: World, given: Parameters, cause: Cause): Stripe.Refund {
  const chargeId = given.text('charge');
  const intentId = given.text('payment_intent');
  const asked = given.integer('amount', { least: 1 });
  const reason = given.text('reason', { oneOf: REASONS }) ?? null;
  const metadata = given.metadata('metadata');
  given.refuseUnknown();
  if (chargeId !== undefined && intentId !== undefined) {
    throw badParameter('charge', 'Give charge or payment_intent, not both');
  }
  const charge = chargeToRefund(world, chargeId, intentId);
  const left = charge.amount - charge.amount_refunded;
  if (isChargedBack(world, charge)) {
    throw refused(`Charge ${charge.id} has been charged back; cannot issue a refund.`, { code: 'charge_disputed' });
  }
  if (left === 0) {
    throw refused(`Charge ${charge.id} has already been refunded.`, { code: 'charge_already_refunded' });
  }
  const amount = asked ?? left;
  if (amount > left) {
    const [wanted, rest] = [moneyText(amount, charge.currency), moneyText(left, charge.currency)];
    throw refused(`Refund amount (${wanted}) is greater than unrefunded amount on charge (${rest})`, {
      param: 'amount',
    });
  }
  return giveBack(world, charge, { amount, reason, metadata }, cause);
}

function isChargedBack(world: World, charge: Stripe.Charge): boolean {
  return world.state.disputes.oldestFirst().some(({ charge: of, status }) => of === charge.id && status !== 'won');
}

function chargeToRefund(world: World, chargeId: string | undefined, intentId: string | undefined): Stripe.Charge {
  if (chargeId !== undefined) {
    const charge = world.state.charges.find(chargeId);
    if (!charge) throw noSuch('charge', chargeId, 'charge');
    if (charge.status !== 'succeeded') throw refused(`Charge ${chargeId} did not succeed; it cannot be refunded.`);
    return charge;
  }
  if (intentId === undefined) throw missingParameter('payment_intent');
  const intent = world.state.intents.find(intentId);
  if (!intent) throw noSuch('payment_intent', intentId, 'payment_intent');
  if (intent.status !== 'succeeded' || typeof intent.latest_charge !== 'string') {
    throw refused(`This PaymentIntent (${intentId}) does not have a successful charge to refund.`);
  }
  return world.state.charges.get(intent.latest_charge);
}

function giveBack(
  world: World,
  charge: Stripe.Charge,
  wish: { amount: number; reason: Stripe.Refund['reason']; metadata: Record<string, string> },
  cause: Cause,
): Stripe.Refund {
  const id = identifier('re_');
  const status = world.takeRefundStatus();
  const transaction = post(world, {
    type: 'refund',
    category: 'refund',
    amount: -wish.amount,
    fee: 0,
    currency: charge.currency,
    source: id,
    description: charge.description,
  });
  const refund = world.state.refunds.add({
    id,
    object: 'refund',
    amount: wish.amount,
    balance_transaction: transaction.id,
    charge: charge.id,
    created: world.now(),
    currency: charge.currency,
    customer: null,
    customer_account: null,
    destination_details: { type: 'card', card: { type: 'refund' } },
    metadata: wish.metadata,
    payment_intent: charge.payment_intent,
    payment_method: charge.payment_method,
    reason: wish.reason,
    receipt_number: null,
    source_transfer_reversal: null,
    status,
    transfer_reversal: null,
    ...(status === 'pending' ? { pending_reason: 'processing' } : {}),
  } satisfies Stripe.Refund);
  const refunded = charge.amount_refunded + wish.amount;
  const changed = world.state.charges.change(charge.id, {
    amount_refunded: refunded,
    refunded: refunded === charge.amount,
  });
  emit(world, 'refund.created', refund, cause);
  emit(world, 'charge.refunded', changed, cause, {
    amount_refunded: charge.amount_refunded,
    ...(changed.refunded === charge.refunded ? {} : { refunded: charge.refunded }),
  });
  return refund;
}

/** A pending refund reached the buyer. */
export function succeedRefund(world: World, refund: Stripe.Refund): Stripe.Refund {
  const { pending_reason: _reason, ...rest } = refund;
  const done = world.state.refunds.change(refund.id, { ...rest, status: 'succeeded', pending_reason: undefined });
  emit(world, 'charge.refund.updated', done, NO_CAUSE, { status: refund.status });
  emit(world, 'refund.updated', done, NO_CAUSE, { status: refund.status });
  return done;
}

/** The buyer's bank sent a refund back: the money returns to the balance and can be refunded again. */
export function failRefund(world: World, refund: Stripe.Refund, reason: string): Stripe.Refund {
  const charge = world.state.charges.get(idOf(refund.charge));
  const transaction = post(world, {
    type: 'refund_failure',
    category: 'refund_failure',
    amount: refund.amount,
    fee: 0,
    currency: refund.currency,
    source: refund.id,
    description: 'Refund failed',
  });
  const failed = world.state.refunds.change(refund.id, {
    status: 'failed',
    failure_reason: reason,
    failure_balance_transaction: transaction.id,
    pending_reason: undefined,
  });
  world.state.charges.change(charge.id, { amount_refunded: charge.amount_refunded - refund.amount, refunded: false });
  const previous = { status: refund.status };
  emit(world, 'charge.refund.updated', failed, NO_CAUSE, previous);
  emit(world, 'refund.updated', failed, NO_CAUSE, previous);
  emit(world, 'refund.failed', failed, NO_CAUSE, previous);
  return failed;
}
