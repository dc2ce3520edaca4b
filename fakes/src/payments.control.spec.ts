import { request } from 'node:http';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import Stripe from 'stripe';
import { startPayments, type PaymentsFake } from './payments.js';
import { clientOf, errorOf, order, paidOrder } from './testing/shop.js';

let fake: PaymentsFake;
let client: Stripe;

beforeAll(async () => {
  fake = await startPayments();
  client = clientOf(fake);
});
afterAll(() => fake.close());
beforeEach(() => fake.control('POST', '/control/reset'));

const spoil = (fault: object) => fake.control('POST', '/control/faults', fault);
const sessions = async () => (await client.checkout.sessions.list()).data.length;
const create = (key: string, its = client) => its.checkout.sessions.create(order(), { idempotencyKey: key });

describe('a failing service', () => {
  it('answers the next requests with a status, then works again', async () => {
    await spoil({ kind: 'fail', status: 500, count: 2 });
    expect((await errorOf(create('a'))).statusCode).toBe(500);
    expect((await errorOf(create('a'))).statusCode).toBe(500);
    await expect(create('a')).resolves.toHaveProperty('id');
    expect(await sessions()).toBe(1);
  });

  it('is retried by the SDK with the same key, so that one session is made', async () => {
    await spoil({ kind: 'fail', status: 503, count: 2, processed: true });
    const session = await create('b', clientOf(fake, { retries: 2 }));
    expect(session.status).toBe('open');
    expect(await sessions()).toBe(1);
    expect(
      fake
        .requests()
        .slice(0, 3)
        .map(({ outcome }) => outcome),
    ).toEqual(['fail after processing', 'fail after processing', '200 replayed']);
  });

  it('can keep a 500 under the key: it is replayed for ever, and another key works', async () => {
    await spoil({ kind: 'fail', status: 500, stored: true, retry: false });
    const its = clientOf(fake, { retries: 2 });
    expect((await errorOf(create('c', its))).statusCode).toBe(500);
    const again = await errorOf(create('c', its));
    expect([again.statusCode, again.headers?.['idempotent-replayed']]).toEqual([500, 'true']);
    await expect(create('d', its)).resolves.toHaveProperty('id');
    expect(await sessions()).toBe(1);
  });

  it('limits the rate with a 429, which the SDK does not retry', async () => {
    await spoil({ kind: 'fail', status: 429 });
    const refusal = await errorOf(create('e', clientOf(fake, { retries: 2 })));
    expect(refusal).toBeInstanceOf(Stripe.errors.StripeRateLimitError);
    expect(await sessions()).toBe(0);
  });

  it('hangs until the client gives up, before or after it did the work', async () => {
    const hasty = clientOf(fake, { timeout: 150 });
    await spoil({ kind: 'hang', method: 'POST' });
    expect(await errorOf(create('f', hasty))).toBeInstanceOf(Stripe.errors.StripeConnectionError);
    expect(await sessions()).toBe(0);
    await spoil({ kind: 'hang', method: 'POST', processed: true });
    expect(await errorOf(create('f', hasty))).toBeInstanceOf(Stripe.errors.StripeConnectionError);
    const session = await create('f', hasty);
    expect(session.lastResponse.headers['idempotent-replayed']).toBe('true');
    expect(await sessions()).toBe(1);
  });

  it('resets the connection before or after it did the work', async () => {
    // The SDK retries a closed connection once by itself; two faults outlast it.
    await spoil({ kind: 'reset', method: 'POST', count: 2 });
    expect(await errorOf(create('g'))).toBeInstanceOf(Stripe.errors.StripeConnectionError);
    expect(await sessions()).toBe(0);
    await spoil({ kind: 'reset', method: 'POST', count: 2, processed: true });
    expect(await errorOf(create('g'))).toBeInstanceOf(Stripe.errors.StripeConnectionError);
    expect(await sessions()).toBe(1);
    await create('g');
    expect(await sessions()).toBe(1);
  });

  it('answers garbage after it did the work', async () => {
    await spoil({ kind: 'garbage' });
    const refusal = await errorOf(create('h'));
    expect(refusal.message).toContain('Invalid JSON');
    expect(await sessions()).toBe(1);
  });

  it('takes its time', async () => {
    await spoil({ kind: 'delay', milliseconds: 200 });
    const started = Date.now();
    await create('i');
    expect(Date.now() - started).toBeGreaterThanOrEqual(190);
  });

  it('can fail for one kind of request only', async () => {
    await spoil({ kind: 'fail', status: 500, method: 'POST', path: '/v1/refunds' });
    await expect(create('j')).resolves.toHaveProperty('id');
    expect((await errorOf(client.refunds.create({ charge: 'ch_1' }))).statusCode).toBe(500);
    await spoil({ kind: 'fail' });
    await fake.control('DELETE', '/control/faults');
    await expect(create('k')).resolves.toHaveProperty('id');
  });
});

describe('a payment that is not what was asked for', () => {
  it('has another amount, currency, mode, order or metadata, once', async () => {
    await fake.control('POST', '/control/next-payment', {
      amount: 1,
      currency: 'usd',
      livemode: true,
      client_reference_id: 'order-99',
      metadata: { order: '99' },
    });
    expect(await paidOrder(fake, client)).toMatchObject({
      amount_total: 1,
      currency: 'usd',
      livemode: true,
      client_reference_id: 'order-99',
      metadata: { order: '99' },
      payment_status: 'paid',
    });
    expect((await client.charges.list()).data[0]).toMatchObject({ amount: 1, currency: 'usd', livemode: true });
    const [event] = (await client.events.list({ type: 'checkout.session.completed' })).data;
    expect(event?.livemode).toBe(true);
    expect((await paidOrder(fake, client)).amount_total).toBe(20_800);
  });

  it('comes after its session has expired', async () => {
    const { id } = await client.checkout.sessions.create(order());
    await fake.control('POST', `/control/sessions/${id}/expire`);
    await expect(fake.control('POST', `/control/sessions/${id}/pay`)).rejects.toThrow('409');
    await fake.control('POST', `/control/sessions/${id}/pay`, { late: true });
    expect((await client.checkout.sessions.retrieve(id)).payment_status).toBe('paid');
  });
});

describe('the clock', () => {
  it('can be turned on, so that sessions end and money becomes available', async () => {
    await paidOrder(fake, client);
    const { id } = await client.checkout.sessions.create(order());
    await fake.control('POST', '/control/clock', { offset: 3 * 24 * 3600 });
    expect((await client.checkout.sessions.retrieve(id)).status).toBe('expired');
    expect((await client.balance.retrieve()).available).toMatchObject([{ amount: 20_463, currency: 'eur' }]);
  });
});

describe('the controls', () => {
  it('list themselves, show what is kept, and forget it', async () => {
    const list = (await fake.control('GET', '/control')) as { call: string; does: string }[];
    expect(list.map(({ call }) => call)).toContain('POST /control/faults');
    await paidOrder(fake, client);
    const kept = (await fake.control('GET', '/control/state')) as Record<string, unknown[]>;
    expect([kept['sessions']?.length, kept['charges']?.length, kept['events']?.length]).toEqual([1, 1, 4]);
    expect(JSON.stringify(kept)).not.toContain('4242424242424242');
    await fake.control('POST', '/control/reset');
    expect(await sessions()).toBe(0);
  });

  it('refuse what they do not understand', async () => {
    await expect(spoil({ kind: 'explode' })).rejects.toThrow('400');
    await expect(spoil({ status: 200 })).rejects.toThrow('400');
    await expect(spoil({ count: '3' })).rejects.toThrow('400');
    await expect(fake.control('POST', '/control/nothing')).rejects.toThrow('404');
    await expect(fake.control('POST', '/control/sessions/cs_none/expire')).rejects.toThrow('404');
    const answer = await fetch(`${fake.address}/control/faults`, { method: 'POST', body: '{' });
    expect(answer.status).toBe(400);
  });

  it('answer neither to a page of another origin nor under another name', async () => {
    const foreign = await fetch(`${fake.address}/control/state`, { headers: { origin: 'http://elsewhere.example' } });
    expect(foreign.status).toBe(403);
    const status = await new Promise((resolve) => {
      request(`${fake.address}/control/state`, { headers: { host: 'elsewhere.example' } }, (response) => {
        response.resume();
        resolve(response.statusCode);
      }).end();
    });
    expect(status).toBe(403);
  });
});
