import type Stripe from 'stripe';
import { postCharge } from './balance.js';
import type { Decline } from './cards.js';
import { identifier } from './identifier.js';
import type { CardOnFile } from './state.js';
import type { World } from './world.js';

/** How the money comes: by card at once, or by a debit that settles later. */
export type Means =
  | { readonly kind: 'card'; readonly card: CardOnFile; readonly confirmed: boolean }
  | { readonly kind: 'debit'; readonly method: string; readonly holder: string; readonly email: string };

/** Takes the intent's money; the charge succeeds and its fee is known at once. */
export function chargeIntent(world: World, intent: Stripe.PaymentIntent, means: Means): Stripe.Charge {
  const charge = world.state.charges.add({
    ...emptyCharge(world, intent, means),
    amount_captured: intent.amount,
    captured: true,
    outcome: outcome('authorized', 'approved_by_network', null, 'Payment complete.'),
    paid: true,
    status: 'succeeded',
  });
  const transaction = postCharge(world, charge);
  return world.state.charges.change(charge.id, { balance_transaction: transaction.id });
}

/** Notes an attempt that the bank refused. */
export function failCharge(
  world: World,
  intent: Stripe.PaymentIntent,
  means: Means,
  { code, declineCode, sentence }: Decline,
): Stripe.Charge {
  return world.state.charges.add({
    ...emptyCharge(world, intent, means),
    failure_code: code,
    failure_message: sentence,
    outcome: outcome('issuer_declined', 'declined_by_network', declineCode, sentence),
    status: 'failed',
  });
}

function outcome(type: string, network: string, reason: string | null, sentence: string): Stripe.Charge.Outcome {
  return {
    advice_code: null,
    network_advice_code: null,
    network_decline_code: null,
    network_status: network,
    reason,
    risk_level: 'normal',
    seller_message: sentence,
    type,
  };
}

function emptyCharge(world: World, intent: Stripe.PaymentIntent, means: Means): Stripe.Charge {
  const { name, email } =
    means.kind === 'card'
      ? { name: means.card.holder, email: means.card.email }
      : { name: means.holder, email: means.email };
  return {
    id: identifier('ch_'),
    object: 'charge',
    amount: intent.amount,
    amount_captured: 0,
    amount_refunded: 0,
    application: null,
    application_fee: null,
    application_fee_amount: null,
    balance_transaction: null,
    billing_details: { address: null, email, name, phone: null, tax_id: null },
    calculated_statement_descriptor: null,
    captured: false,
    created: world.now(),
    currency: intent.currency,
    customer: null,
    description: intent.description,
    disputed: false,
    failure_balance_transaction: null,
    failure_code: null,
    failure_message: null,
    fraud_details: {},
    livemode: intent.livemode,
    metadata: { ...intent.metadata },
    on_behalf_of: null,
    outcome: null,
    paid: false,
    payment_intent: intent.id,
    payment_method: means.kind === 'card' ? means.card.id : means.method,
    payment_method_details: means.kind === 'card' ? cardDetails(means.card, means.confirmed) : debitDetails(),
    receipt_email: intent.receipt_email,
    receipt_number: null,
    receipt_url: null,
    refunded: false,
    review: null,
    shipping: null,
    source: null,
    source_transfer: null,
    statement_descriptor: intent.statement_descriptor,
    statement_descriptor_suffix: intent.statement_descriptor_suffix,
    status: 'pending',
    transfer_data: null,
    transfer_group: null,
  } satisfies Stripe.Charge;
}

function cardDetails(card: CardOnFile, confirmed: boolean): Stripe.Charge.PaymentMethodDetails {
  return {
    type: 'card',
    card: {
      amount_authorized: null,
      authorization_code: null,
      brand: card.brand,
      checks: { address_line1_check: null, address_postal_code_check: null, cvc_check: 'pass' },
      country: 'IE',
      electronic_commerce_indicator: null,
      exp_month: card.expMonth,
      exp_year: card.expYear,
      fingerprint: null,
      funding: card.funding,
      installments: null,
      last4: card.last4,
      mandate: null,
      network: card.brand,
      network_transaction_id: null,
      regulated_status: null,
      three_d_secure: confirmed ? CONFIRMED : null,
      transaction_link_id: null,
      wallet: null,
    },
  };
}

const CONFIRMED: Stripe.Charge.PaymentMethodDetails.Card.ThreeDSecure = {
  authentication_flow: 'challenge',
  electronic_commerce_indicator: null,
  exemption_indicator: null,
  result: 'authenticated',
  result_reason: null,
  transaction_id: null,
  version: '2.2.0',
};

function debitDetails(): Stripe.Charge.PaymentMethodDetails {
  const unknown = { bank_code: null, branch_code: null, country: 'IE', fingerprint: null, last4: null, mandate: null };
  return { type: 'sepa_debit', sepa_debit: unknown };
}
