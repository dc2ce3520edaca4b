import type Stripe from 'stripe';
import type { CheckedCard } from './card-form.js';
import { conductOf, FAILED_DEBIT, REFUSED_CONFIRMATION, type Decline } from './cards.js';
import { chargeIntent, failCharge, type Means } from './charges.js';
import { identifier } from './identifier.js';
import { declineIntent, intentOf, succeedIntent } from './payment-intents.js';
import { customerDetails } from './session-object.js';
import type { CardOnFile } from './state.js';
import { idOf } from './wire.js';
import { emit, type World } from './world.js';

export type PaymentResult =
  | { readonly kind: 'done'; readonly session: Stripe.Checkout.Session }
  | { readonly kind: 'confirm' }
  | { readonly kind: 'declined'; readonly decline: Decline };

/** Tries to pay an open session by card; the number decides what happens. */
export function payByCard(world: World, sessionId: string, typed: CheckedCard): PaymentResult {
  const session = withSurprise(world, sessionId);
  const conduct = conductOf(typed.number);
  const card: CardOnFile = {
    id: identifier('pm_'),
    brand: conduct.brand,
    last4: typed.number.slice(-4),
    funding: conduct.funding,
    expMonth: typed.expMonth,
    expYear: typed.expYear,
    holder: typed.holder,
    email: typed.email,
  };
  if (session.amount_total === 0)
    return { kind: 'done', session: complete(world, session.id, card, 'no_payment_required') };
  const intent = intentOf(world, session);
  if (conduct.kind === 'declined')
    return decline(world, intent, { kind: 'card', card, confirmed: false }, conduct.decline);
  if (conduct.kind === 'asks') {
    world.state.sessionPrivates.change(session.id, { awaiting: card });
    const url = `${world.publicAddress()}/pay/${session.id}/confirm`;
    const asking = world.state.intents.change(intent.id, {
      status: 'requires_action',
      next_action: { type: 'redirect_to_url', redirect_to_url: { return_url: session.success_url, url } },
    });
    emit(world, 'payment_intent.requires_action', asking);
    return { kind: 'confirm' };
  }
  return take(world, session.id, intent, { kind: 'card', card, confirmed: false }, card);
}

/** Ends the confirmation step that a card asked for. */
export function answerConfirmation(world: World, sessionId: string, agreed: boolean): PaymentResult {
  const session = world.state.sessions.get(sessionId);
  const { awaiting } = world.state.sessionPrivates.get(sessionId);
  if (!awaiting) return { kind: 'declined', decline: REFUSED_CONFIRMATION };
  world.state.sessionPrivates.change(sessionId, { awaiting: null });
  const intent = intentOf(world, session);
  if (agreed) return take(world, sessionId, intent, { kind: 'card', card: awaiting, confirmed: true }, awaiting);
  declineIntent(world, intent.id, REFUSED_CONFIRMATION, undefined);
  return { kind: 'declined', decline: REFUSED_CONFIRMATION };
}

/** Completes the session unpaid: a debit was ordered and its outcome comes later. */
export function payByDebit(world: World, sessionId: string, who: { holder: string; email: string }): PaymentResult {
  const session = withSurprise(world, sessionId);
  const intent = intentOf(world, session);
  const processing = world.state.intents.change(intent.id, {
    status: 'processing',
    payment_method: identifier('pm_'),
    payment_method_types: ['sepa_debit'],
    last_payment_error: null,
  });
  emit(world, 'payment_intent.processing', processing);
  return { kind: 'done', session: complete(world, session.id, who, 'unpaid') };
}

/** The outcome of a debit: the money came, or it did not. */
export function settleDebit(world: World, session: Stripe.Checkout.Session, paid: boolean): Stripe.Checkout.Session {
  const intent = intentOf(world, session);
  const means: Means = {
    kind: 'debit',
    method: idOf(intent.payment_method),
    holder: session.customer_details?.name ?? '',
    email: session.customer_details?.email ?? '',
  };
  if (!paid) {
    decline(world, intent, means, FAILED_DEBIT);
    emit(world, 'checkout.session.async_payment_failed', session);
    return session;
  }
  succeedIntent(world, intent.id, chargeIntent(world, intent, means));
  const settled = world.state.sessions.change(session.id, { payment_status: 'paid' });
  emit(world, 'checkout.session.async_payment_succeeded', settled);
  return settled;
}

function take(
  world: World,
  sessionId: string,
  intent: Stripe.PaymentIntent,
  means: Means,
  card: CardOnFile,
): PaymentResult {
  succeedIntent(world, intent.id, chargeIntent(world, intent, means));
  return { kind: 'done', session: complete(world, sessionId, card, 'paid') };
}

function decline(world: World, intent: Stripe.PaymentIntent, means: Means, why: Decline): PaymentResult {
  declineIntent(world, intent.id, why, failCharge(world, intent, means, why));
  return { kind: 'declined', decline: why };
}

function complete(
  world: World,
  id: string,
  { email, holder }: { readonly email: string; readonly holder: string },
  status: Stripe.Checkout.Session.PaymentStatus,
): Stripe.Checkout.Session {
  const session = world.state.sessions.change(id, {
    customer_details: customerDetails(email, holder),
    payment_status: status,
    status: 'complete',
    url: null,
  });
  emit(world, 'checkout.session.completed', session);
  return session;
}

/** Where the stand-in was told to pay something else than was asked, the session and all that follows from it show it. */
function withSurprise(world: World, sessionId: string): Stripe.Checkout.Session {
  const surprise = world.takeSurprise();
  if (!surprise) return world.state.sessions.get(sessionId);
  const { amount, metadata, ...rest } = surprise;
  const changed = world.state.sessions.change(sessionId, {
    ...rest,
    ...(amount === undefined ? {} : { amount_total: amount, amount_subtotal: amount }),
    ...(metadata === undefined ? {} : { metadata: { ...metadata } }),
  });
  if (typeof changed.payment_intent === 'string') {
    world.state.intents.change(changed.payment_intent, {
      amount: changed.amount_total ?? 0,
      currency: changed.currency ?? '',
      livemode: changed.livemode,
    });
  }
  return changed;
}
