import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import type Stripe from 'stripe';
import { startPayments, type PaymentsFake } from './payments.js';
import { clientOf, line, order } from './testing/shop.js';

let fake: PaymentsFake;
let client: Stripe;

beforeAll(async () => {
  fake = await startPayments({ shopName: 'Fernhollow <Tools>', now: () => Date.UTC(2030, 5, 30, 12) });
  client = clientOf(fake);
});
afterAll(() => fake.close());
beforeEach(() => fake.control('POST', '/control/reset'));

const GOOD = { number: '4242 4242 4242 4242', expiry: '06/30', code: '123', holder: 'A Buyer', means: 'card' };

async function open(overrides: Partial<Stripe.Checkout.SessionCreateParams> = {}): Promise<Stripe.Checkout.Session> {
  return client.checkout.sessions.create(order(overrides));
}

async function submit(path: string, fields: Record<string, string>) {
  const response = await fetch(fake.address + path, {
    method: 'POST',
    body: new URLSearchParams(fields),
    redirect: 'manual',
  });
  return { status: response.status, location: response.headers.get('location'), html: await response.text() };
}

const stateOf = async (id: string) => {
  const { status, payment_status } = await client.checkout.sessions.retrieve(id);
  return [status, payment_status];
};

describe('the payment page', () => {
  it('is marked as a test and shows shop, lines and amount, with nothing unescaped', async () => {
    const { id } = await open({ line_items: [line('<b>Wren</b> 60', 18_900), line('Tip', 950, 2)] });
    const response = await fetch(`${fake.address}/pay/${id}`);
    const html = await response.text();
    expect(html).toContain('<strong>test</strong>');
    expect(html).toContain('Fernhollow &lt;Tools&gt;');
    expect(html).toContain('&lt;b&gt;Wren&lt;/b&gt; 60');
    expect(html).toContain('€208.00');
    expect(html).toContain('http://127.0.0.1:9/cart');
    expect(response.headers.get('content-security-policy')).toContain("default-src 'none'");
  });

  it('bears the name that the shop gave with the session', async () => {
    const { id } = await open({ branding_settings: { display_name: 'The Other Bench' } });
    expect(await (await fetch(`${fake.address}/pay/${id}`)).text()).toContain('to The Other Bench</h1>');
  });

  it('takes a test card and sends the buyer back with the session’s id', async () => {
    const { id } = await open();
    const paid = await submit(`/pay/${id}`, GOOD);
    expect([paid.status, paid.location]).toEqual([303, `http://127.0.0.1:9/orders/17?session=${id}`]);
    expect(await stateOf(id)).toEqual(['complete', 'paid']);
    const again = await submit(`/pay/${id}`, GOOD);
    expect([again.status, again.html]).toEqual([200, expect.stringContaining('This payment is done')]);
    expect((await client.charges.list()).data).toHaveLength(1);
  });

  // Numbers and codes: docs.stripe.com/testing, "Declined payments".
  it.each([
    ['4000000000000002', 'card_declined', 'generic_decline', 'The card was declined'],
    ['4000000000009995', 'card_declined', 'insufficient_funds', 'not enough money'],
    ['4000000000009987', 'card_declined', 'lost_card', 'The card was declined'],
    ['4000000000000069', 'expired_card', 'expired_card', 'has expired'],
    ['4000000000000127', 'incorrect_cvc', 'incorrect_cvc', 'security code is not right'],
    ['4000000000000119', 'processing_error', 'processing_error', 'Something went wrong'],
    ['4111111111111111', 'card_declined', 'test_mode_live_card', 'takes test card numbers only'],
  ])('declines %s in a sentence and lets one try again', async (number, code, declineCode, sentence) => {
    const { id } = await open();
    const declined = await submit(`/pay/${id}`, { ...GOOD, number });
    expect([declined.status, declined.html]).toEqual([422, expect.stringContaining(sentence)]);
    expect(declined.html).toContain('role="alert"');
    expect(await stateOf(id)).toEqual(['open', 'unpaid']);
    const { payment_intent } = await client.checkout.sessions.retrieve(id, { expand: ['payment_intent'] });
    expect(payment_intent).toMatchObject({
      status: 'requires_payment_method',
      last_payment_error: { code, decline_code: declineCode },
    });
    const [charge] = (await client.charges.list()).data;
    expect(charge).toMatchObject({ status: 'failed', failure_code: code, paid: false });
    expect((await submit(`/pay/${id}`, GOOD)).status).toBe(303);
    expect(await stateOf(id)).toEqual(['complete', 'paid']);
    expect((await client.paymentIntents.list()).data).toHaveLength(1);
  });

  it.each([
    ['a digit mistyped', { number: '4242424242424241' }, 'This is no card number'],
    ['too few digits', { number: '4242' }, 'This is no card number'],
    ['an expiry gone by', { expiry: '05/30' }, 'The card has expired'],
    ['an expiry that is none', { expiry: '13/30' }, 'month and year'],
    ['a short code', { code: '12' }, 'security code has 3 digits'],
    ['no name', { holder: ' ' }, 'Write the name on the card'],
  ])('asks again for %s and charges nothing', async (_what, fields, sentence) => {
    const { id } = await open();
    const refused = await submit(`/pay/${id}`, { ...GOOD, ...fields });
    expect([refused.status, refused.html]).toEqual([422, expect.stringContaining(sentence)]);
    expect(refused.html).toContain('aria-invalid="true"');
    expect((await client.charges.list()).data).toEqual([]);
  });

  it('asks for an e-mail address if the shop gave none', async () => {
    const { line_items, success_url, mode } = order();
    const { id } = await client.checkout.sessions.create({ line_items, success_url, mode });
    expect((await submit(`/pay/${id}`, GOOD)).html).toContain('Write an e-mail address');
    await submit(`/pay/${id}`, { ...GOOD, email: 'someone@fernhollow.example' });
    const { customer_details } = await client.checkout.sessions.retrieve(id);
    expect(customer_details).toMatchObject({ email: 'someone@fernhollow.example', name: 'A Buyer' });
  });

  it('asks some cards’ holders to confirm, and takes no for an answer', async () => {
    const { id } = await open();
    const asked = await submit(`/pay/${id}`, { ...GOOD, number: '4000002500003155' });
    expect([asked.status, asked.location]).toEqual([303, `/pay/${id}/confirm`]);
    expect(await (await fetch(`${fake.address}/pay/${id}/confirm`)).text()).toContain('Confirm the payment');
    const refused = await submit(`/pay/${id}/confirm`, { answer: 'no' });
    expect(refused.html).toContain('was not confirmed');
    expect(await stateOf(id)).toEqual(['open', 'unpaid']);
    await submit(`/pay/${id}`, { ...GOOD, number: '4000002500003155' });
    const agreed = await submit(`/pay/${id}/confirm`, { answer: 'yes' });
    expect(agreed.status).toBe(303);
    expect(await stateOf(id)).toEqual(['complete', 'paid']);
    const [charge] = (await client.charges.list()).data;
    expect(charge?.payment_method_details?.card?.three_d_secure?.result).toBe('authenticated');
  });

  it('offers a bank debit where the shop allows it', async () => {
    const { id } = await open({ allowed_payment_method_types: ['card', 'sepa_debit'] });
    const ordered = await submit(`/pay/${id}`, { means: 'debit', holder: 'A Buyer' });
    expect(ordered.status).toBe(303);
    expect(await stateOf(id)).toEqual(['complete', 'unpaid']);
    const other = await open();
    expect((await submit(`/pay/${other.id}`, { means: 'debit', holder: 'A Buyer' })).status).toBe(422);
  });

  it('says so when the session has expired, or when there is none', async () => {
    const { id } = await open();
    await client.checkout.sessions.expire(id);
    for (const answer of [await submit(`/pay/${id}`, GOOD), await submit(`/pay/${id}/confirm`, { answer: 'yes' })]) {
      expect([answer.status, answer.html]).toEqual([410, expect.stringContaining('This payment page has expired')]);
    }
    expect((await fetch(`${fake.address}/pay/cs_test_none`)).status).toBe(404);
    expect(await (await fetch(`${fake.address}/`)).text()).toContain('expired, unpaid');
  });
});
