import Stripe from 'stripe';
import type { PaymentsFake } from '../payments.js';

export const SECRET = 'whsec_of_the_spec';

/** The official client, pointed at the stand-in. */
export function clientOf(
  fake: PaymentsFake,
  config: { readonly timeout?: number; readonly retries?: number } = {},
): Stripe {
  return new Stripe('sk_test_spec', {
    host: '127.0.0.1',
    port: fake.port,
    protocol: 'http',
    telemetry: false,
    maxNetworkRetries: config.retries ?? 0,
    timeout: config.timeout ?? 5000,
  });
}

export function line(name: string, amount: number, quantity = 1, currency = 'eur') {
  return { price_data: { currency, unit_amount: amount, product_data: { name } }, quantity };
}

export function order(
  overrides: Partial<Stripe.Checkout.SessionCreateParams> = {},
): Stripe.Checkout.SessionCreateParams {
  return {
    mode: 'payment',
    line_items: [line('Wren 60', 18_900), line('Tip, chisel', 950, 2)],
    client_reference_id: 'order-17',
    metadata: { order: '17' },
    payment_intent_data: { metadata: { order: '17' }, description: 'Order 17' },
    success_url: 'http://127.0.0.1:9/orders/17?session={CHECKOUT_SESSION_ID}',
    cancel_url: 'http://127.0.0.1:9/cart',
    customer_email: 'customer@fernhollow.example',
    ...overrides,
  };
}

/** Makes a session and pays it as a buyer would, with a card that works. */
export async function paidOrder(
  fake: PaymentsFake,
  client: Stripe,
  overrides: Partial<Stripe.Checkout.SessionCreateParams> = {},
): Promise<Stripe.Checkout.Session> {
  const session = await client.checkout.sessions.create(order(overrides));
  await fake.control('POST', `/control/sessions/${session.id}/pay`);
  return client.checkout.sessions.retrieve(session.id);
}

/** What the call threw, as the SDK's error. */
export async function errorOf(call: Promise<unknown>): Promise<InstanceType<typeof Stripe.errors.StripeError>> {
  try {
    await call;
  } catch (fault) {
    if (fault instanceof Stripe.errors.StripeError) return fault;
    throw fault;
  }
  throw new Error('The call was expected to be refused.');
}
