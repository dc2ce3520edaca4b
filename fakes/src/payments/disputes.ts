import type Stripe from 'stripe';
import { post } from './balance.js';
import { disputeFeeOf } from './currency.js';
import { identifier } from './identifier.js';
import { idOf } from './wire.js';
import { emit, NO_CAUSE, type World } from './world.js';

const SECONDS_TO_ANSWER = 10 * 24 * 3600;

/** A buyer disputes a charge: its amount and a fee leave the balance. */
export function openDispute(world: World, charge: Stripe.Charge, amount: number, reason: string): Stripe.Dispute {
  const id = identifier('dp_');
  const withdrawal = post(world, {
    type: 'adjustment',
    category: 'dispute',
    amount: -amount,
    fee: disputeFeeOf(charge.currency),
    feeText: 'Dispute fee',
    currency: charge.currency,
    source: id,
    description: `Chargeback withdrawal for ${charge.id}`,
  });
  const dispute = world.state.disputes.add({
    id,
    object: 'dispute',
    amount,
    balance_transactions: [],
    charge: charge.id,
    created: world.now(),
    currency: charge.currency,
    enhanced_eligibility_types: [],
    evidence: NO_EVIDENCE,
    evidence_details: {
      due_by: world.now() + SECONDS_TO_ANSWER,
      enhanced_eligibility: {},
      has_evidence: false,
      past_due: false,
      submission_count: 0,
      submission_method: 'not_applicable',
    },
    intended_submission_method: null,
    is_charge_refundable: false,
    livemode: charge.livemode,
    metadata: {},
    network_reason_code: null,
    payment_intent: charge.payment_intent,
    reason,
    status: 'needs_response',
  } satisfies Stripe.Dispute);
  world.state.charges.change(charge.id, { disputed: true });
  emit(world, 'charge.dispute.created', dispute);
  const withdrawn = world.state.disputes.change(id, { balance_transactions: [withdrawal] });
  emit(world, 'charge.dispute.funds_withdrawn', withdrawn, NO_CAUSE, { balance_transactions: [] });
  return withdrawn;
}

/** The shop's answer is with the bank. */
export function answerDispute(world: World, dispute: Stripe.Dispute): Stripe.Dispute {
  const answered = world.state.disputes.change(dispute.id, {
    status: 'under_review',
    evidence_details: { ...dispute.evidence_details, has_evidence: true, submission_count: 1 },
  });
  emit(world, 'charge.dispute.updated', answered, NO_CAUSE, { status: dispute.status });
  return answered;
}

/** Ends a dispute; if it was won the amount comes back, the fee does not. */
export function closeDispute(world: World, dispute: Stripe.Dispute, won: boolean): Stripe.Dispute {
  const closed = world.state.disputes.change(dispute.id, { status: won ? 'won' : 'lost' });
  emit(world, 'charge.dispute.closed', closed, NO_CAUSE, { status: dispute.status });
  if (!won) return closed;
  const back = post(world, {
    type: 'adjustment',
    category: 'dispute_reversal',
    amount: dispute.amount,
    fee: 0,
    currency: dispute.currency,
    source: dispute.id,
    description: `Chargeback reversal for ${idOf(dispute.charge)}`,
  });
  const previous = { balance_transactions: dispute.balance_transactions };
  const reinstated = world.state.disputes.change(dispute.id, {
    balance_transactions: [...dispute.balance_transactions, back],
  });
  emit(world, 'charge.dispute.funds_reinstated', reinstated, NO_CAUSE, previous);
  return reinstated;
}

const NO_EVIDENCE: Stripe.Dispute.Evidence = {
  access_activity_log: null,
  billing_address: null,
  cancellation_policy: null,
  cancellation_policy_disclosure: null,
  cancellation_rebuttal: null,
  customer_communication: null,
  customer_email_address: null,
  customer_name: null,
  customer_purchase_ip: null,
  customer_signature: null,
  duplicate_charge_documentation: null,
  duplicate_charge_explanation: null,
  duplicate_charge_id: null,
  enhanced_evidence: {},
  product_description: null,
  receipt: null,
  refund_policy: null,
  refund_policy_disclosure: null,
  refund_refusal_explanation: null,
  service_date: null,
  service_documentation: null,
  shipping_address: null,
  shipping_carrier: null,
  shipping_date: null,
  shipping_documentation: null,
  shipping_tracking_number: null,
  uncategorized_file: null,
  uncategorized_text: null,
};
