import type Stripe from 'stripe';
import type { Decline } from './cards.js';
import { identifier } from './identifier.js';
import { emit, type World } from './world.js';

/** The session's intent, made at the first attempt to pay. */
export function intentOf(world: World, session: Stripe.Checkout.Session): Stripe.PaymentIntent {
  if (typeof session.payment_intent === 'string') return world.state.intents.get(session.payment_intent);
  const { intentData } = world.state.sessionPrivates.get(session.id);
  const id = identifier('pi_');
  const intent = {
    id,
    object: 'payment_intent',
    allowed_payment_method_types: null,
    amount: session.amount_total ?? 0,
    amount_capturable: 0,
    amount_received: 0,
    application: null,
    application_fee_amount: null,
    automatic_payment_methods: null,
    canceled_at: null,
    cancellation_reason: null,
    capture_method: 'automatic_async',
    client_secret: identifier(`${id}_secret_`),
    confirmation_method: 'automatic',
    created: world.now(),
    currency: session.currency ?? '',
    customer: null,
    customer_account: null,
    description: intentData.description,
    excluded_payment_method_types: null,
    last_payment_error: null,
    latest_charge: null,
    livemode: session.livemode,
    managed_payments: { enabled: false },
    metadata: { ...intentData.metadata },
    next_action: null,
    on_behalf_of: null,
    payment_method: null,
    payment_method_configuration_details: null,
    payment_method_options: {},
    payment_method_types: session.payment_method_types,
    payment_record: null,
    processing: null,
    receipt_email: intentData.receipt_email,
    review: null,
    setup_future_usage: null,
    shipping: null,
    source: null,
    statement_descriptor: intentData.statement_descriptor,
    statement_descriptor_suffix: intentData.statement_descriptor_suffix,
    status: 'requires_payment_method',
    transfer_data: null,
    transfer_group: null,
  } satisfies Stripe.PaymentIntent;
  world.state.intents.add(intent);
  world.state.sessions.change(session.id, { payment_intent: id });
  emit(world, 'payment_intent.created', intent);
  return intent;
}

export function succeedIntent(world: World, id: string, charge: Stripe.Charge): Stripe.PaymentIntent {
  const intent = world.state.intents.change(id, {
    amount_received: charge.amount,
    last_payment_error: null,
    latest_charge: charge.id,
    next_action: null,
    payment_method: charge.payment_method,
    status: 'succeeded',
  });
  emit(world, 'charge.succeeded', charge);
  emit(world, 'payment_intent.succeeded', intent);
  return intent;
}

export function declineIntent(
  world: World,
  id: string,
  decline: Decline,
  charge: Stripe.Charge | undefined,
): Stripe.PaymentIntent {
  const intent = world.state.intents.change(id, {
    last_payment_error: {
      code: decline.code,
      decline_code: decline.declineCode,
      message: decline.sentence,
      type: 'card_error',
      ...(charge ? { charge: charge.id } : {}),
    },
    latest_charge: charge?.id ?? null,
    next_action: null,
    status: 'requires_payment_method',
  });
  if (charge) emit(world, 'charge.failed', charge);
  emit(world, 'payment_intent.payment_failed', intent);
  return intent;
}
