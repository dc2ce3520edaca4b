import type Stripe from 'stripe';
import { badParameter, refused } from './api-error.js';
import { isEmail } from './card-form.js';
import { checkChargeable, checkedCurrency } from './currency.js';
import { identifier } from './identifier.js';
import { notSpoken, readLines } from './line-items.js';
import type { Parameters } from './parameters.js';
import { newSession } from './session-object.js';
import type { IntentData } from './state.js';
import { emit, NO_CAUSE, type Cause, type World } from './world.js';

const SHORTEST_SECONDS = 30 * 60;
const LONGEST_SECONDS = 24 * 3600;
const METHODS: readonly string[] = ['card', 'sepa_debit'];

export function createSession(world: World, given: Parameters): Stripe.Checkout.Session {
  const now = world.now();
  if (given.requiredText('mode') !== 'payment') throw notSpoken('mode', 'other than payment');
  const uiMode = given.text('ui_mode') ?? 'hosted_page';
  if (uiMode !== 'hosted_page') throw notSpoken('ui_mode', 'other than hosted_page');
  refuseSwitchedOn(given);
  const lines = readLines(given.children('line_items'), now);
  const currency = lines[0]?.currency ?? '';
  const amount = lines.reduce((sum, line) => sum + line.amount_total, 0);
  const asked = given.text('currency');
  if (asked !== undefined && checkedCurrency(asked, 'currency') !== currency) {
    throw badParameter('currency', 'The currency of the lines differs from the currency of the session');
  }
  const id = identifier('cs_test_', 56);
  const seed = {
    id,
    url: `${world.publicAddress()}/pay/${id}`,
    created: now,
    expiresAt: readExpiry(given, now),
    currency,
    amount,
    successUrl: readAddress(given, 'success_url', true),
    cancelUrl: given.has('cancel_url') ? readAddress(given, 'cancel_url', false) : null,
    clientReferenceId: given.text('client_reference_id', { longest: 200 }) ?? null,
    customerEmail: readEmail(given),
    metadata: given.metadata('metadata'),
    allowedMethods: readMethods(given),
    locale: given.text('locale') ?? null,
    shopName: readShopName(given.child('branding_settings')) ?? world.shopName,
    submitType: given.text('submit_type', { oneOf: ['auto', 'book', 'donate', 'pay'] }) ?? null,
  };
  const intentData = readIntentData(given.child('payment_intent_data'));
  given.refuseUnknown();
  if (amount > 0) checkChargeable(amount, currency, 'line_items');
  world.state.sessionPrivates.add({ id, lines, intentData, awaiting: null });
  return world.state.sessions.add(newSession(seed));
}

/** Features that may be named to switch them off, and are refused switched on. */
function refuseSwitchedOn(given: Parameters): void {
  for (const name of ['adaptive_pricing', 'automatic_tax', 'invoice_creation', 'phone_number_collection']) {
    const feature = given.child(name);
    if (feature?.boolean('enabled') === true) throw notSpoken(`${name}[enabled]`, 'switched on');
    feature?.refuseUnknown();
  }
  if (given.boolean('allow_promotion_codes') === true) throw notSpoken('allow_promotion_codes', 'switched on');
  given.text('billing_address_collection', { oneOf: ['auto'] });
  given.text('customer_creation', { oneOf: ['if_required'] });
}

function readExpiry(given: Parameters, now: number): number {
  const expiresAt = given.integer('expires_at') ?? now + LONGEST_SECONDS;
  // A few seconds of grace, as the asker worked the instant out before asking.
  if (expiresAt < now + SHORTEST_SECONDS - 5) {
    throw badParameter('expires_at', 'The expires_at timestamp must be at least 30 minutes from now');
  }
  if (expiresAt > now + LONGEST_SECONDS + 5) {
    throw badParameter('expires_at', 'The expires_at timestamp must be less than 24 hours from now');
  }
  return expiresAt;
}

function readAddress(given: Parameters, name: string, allowsTemplate: boolean): string {
  const address = given.requiredText(name);
  const plain = allowsTemplate ? address.replaceAll('{CHECKOUT_SESSION_ID}', 'cs_test') : address;
  if (!URL.canParse(plain) || !/^https?:$/.test(new URL(plain).protocol)) {
    throw badParameter(name, 'Not a valid URL', 'url_invalid');
  }
  return address;
}

function readEmail(given: Parameters): string | null {
  const email = given.text('customer_email');
  if (email === undefined) return null;
  if (!isEmail(email)) throw badParameter('customer_email', `Invalid email address: ${email}`, 'email_invalid');
  return email;
}

/** The page shows the shop's name and takes no other branding. */
function readShopName(branding: Parameters | undefined): string | undefined {
  const name = branding?.text('display_name', { longest: 200 });
  branding?.refuseUnknown();
  return name;
}

/** A bank debit is offered only where it is named. */
function readMethods(given: Parameters): string[] {
  const methods = given.texts('allowed_payment_method_types');
  const strange = methods.find((method) => !METHODS.includes(method));
  if (strange !== undefined) throw notSpoken('allowed_payment_method_types', strange);
  return methods;
}

function readIntentData(data: Parameters | undefined): IntentData {
  const read = {
    description: data?.text('description', { longest: 1000 }) ?? null,
    metadata: data?.metadata('metadata') ?? {},
    receipt_email: data?.text('receipt_email') ?? null,
    statement_descriptor: data?.text('statement_descriptor', { longest: 22 }) ?? null,
    statement_descriptor_suffix: data?.text('statement_descriptor_suffix', { longest: 22 }) ?? null,
  };
  if (data?.text('capture_method', { oneOf: ['automatic', 'automatic_async', 'manual'] }) === 'manual') {
    throw notSpoken('payment_intent_data[capture_method]', 'manual');
  }
  data?.refuseUnknown();
  return read;
}

export function expireSession(world: World, id: string, cause: Cause = NO_CAUSE): Stripe.Checkout.Session {
  const session = world.state.sessions.get(id);
  if (session.status !== 'open') {
    throw refused(
      `Only Checkout Sessions with a status in ["open"] can be expired. This Checkout Session has a status of \`${session.status}\`.`,
    );
  }
  if (typeof session.payment_intent === 'string') {
    const intent = world.state.intents.change(session.payment_intent, {
      status: 'canceled',
      canceled_at: world.now(),
      cancellation_reason: 'expired',
      next_action: null,
    });
    emit(world, 'payment_intent.canceled', intent, cause);
  }
  world.state.sessionPrivates.change(id, { awaiting: null });
  const expired = world.state.sessions.change(id, { status: 'expired', url: null });
  emit(world, 'checkout.session.expired', expired, cause);
  return expired;
}

/** Ends the sessions whose time has come. */
export function expireDue(world: World): void {
  for (const session of world.state.sessions.oldestFirst()) {
    if (session.status === 'open' && session.expires_at <= world.now()) expireSession(world, session.id);
  }
}
