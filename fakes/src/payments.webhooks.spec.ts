import { afterEach, beforeEach, describe, expect, it } from '@jest/globals';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import Stripe from 'stripe';
import { idOf } from './payments/wire.js';
import { startPayments, type PaymentsFake } from './payments.js';
import { Receiver } from './testing/receiver.js';
import { clientOf, order, paidOrder, SECRET } from './testing/shop.js';

const PAID = ['payment_intent.created', 'charge.succeeded', 'payment_intent.succeeded', 'checkout.session.completed'];

let fake: PaymentsFake;
let client: Stripe;
let shop: Receiver;

beforeEach(async () => {
  shop = await new Receiver().start();
  fake = await startPayments({ webhooks: [{ url: shop.url, secret: SECRET }], retryDelays: [10, 20] });
  client = clientOf(fake);
});
afterEach(async () => {
  await fake.close();
  await shop.stop();
});

function verified(index: number): Stripe.Event {
  const { body, signature } = shop.received[index] ?? { body: '', signature: '' };
  return client.webhooks.constructEvent(body, signature, SECRET);
}

describe('webhooks', () => {
  it('arrive in order, signed so that the SDK itself accepts them', async () => {
    const session = await paidOrder(fake, client);
    await fake.webhooksSettled();
    expect(shop.types).toEqual(PAID);
    const event = verified(3);
    expect(event.api_version).toBe('2026-10-28.endive');
    if (event.type !== 'checkout.session.completed') throw new Error(`unexpected ${event.type}`);
    expect(event.data.object).toMatchObject({ id: session.id, amount_total: 20_800, payment_status: 'paid' });
    expect((await client.events.list({ delivery_success: true })).data).toHaveLength(4);
  });

  it('are refused by the SDK with another secret, a changed byte, or after five minutes', async () => {
    await paidOrder(fake, client);
    await fake.webhooksSettled();
    const { body, signature } = shop.received[0] ?? { body: '', signature: '' };
    const { webhooks } = client;
    const refused = Stripe.errors.StripeSignatureVerificationError;
    expect(() => webhooks.constructEvent(body, signature, 'whsec_other')).toThrow(refused);
    const changed = body.replace('20800', '20801');
    expect(() => webhooks.constructEvent(changed, signature, SECRET)).toThrow(refused);
    const late = Date.now() + 301_000;
    expect(() => webhooks.constructEvent(body, signature, SECRET, undefined, undefined, late)).toThrow(/tolerance/);
  });

  it('carry two signatures while the secret is being changed', async () => {
    fake.setWebhooks([{ url: shop.url, secrets: ['whsec_old', 'whsec_new'], events: [] }]);
    await paidOrder(fake, client);
    await fake.webhooksSettled();
    const { body, signature } = shop.received[0] ?? { body: '', signature: '' };
    for (const secret of ['whsec_old', 'whsec_new']) {
      expect(client.webhooks.constructEvent(body, signature, secret).type).toBe('payment_intent.created');
    }
  });

  it('can be signed as of an instant too long ago', async () => {
    await fake.control('POST', '/control/webhooks/conduct', { age: 301 });
    await paidOrder(fake, client);
    await fake.webhooksSettled();
    expect(() => verified(0)).toThrow(/tolerance/);
  });

  it('go to each endpoint for the types it listens to', async () => {
    fake.setWebhooks([{ url: shop.url, secrets: [SECRET], events: ['checkout.session.completed'] }]);
    await paidOrder(fake, client);
    await fake.webhooksSettled();
    expect(shop.types).toEqual(['checkout.session.completed']);
  });

  it('are tried again until taken, and later ones wait their turn', async () => {
    shop.answers = [500, 503];
    await paidOrder(fake, client);
    await fake.webhooksSettled();
    expect(shop.types).toEqual([PAID[0], PAID[0], ...PAID]);
    expect(fake.webhookAttempts().map(({ attempt, outcome }) => `${attempt}: ${outcome}`)).toEqual([
      '1: 500',
      '2: 503',
      '3: 200',
      '1: 200',
      '1: 200',
      '1: 200',
    ]);
  });

  it('are given up after the last attempt, and can be sent again', async () => {
    shop.answers = [500, 500, 500];
    await paidOrder(fake, client);
    await fake.webhooksSettled();
    expect(shop.types).toEqual([PAID[0], PAID[0], ...PAID]);
    const [lost] = (await client.events.list({ delivery_success: false })).data;
    expect(lost?.type).toBe('payment_intent.created');
    await fake.control('POST', '/control/webhooks/resend', { event: lost?.id, times: 2 });
    await fake.webhooksSettled();
    expect(shop.types.slice(-2)).toEqual(['payment_intent.created', 'payment_intent.created']);
  });

  it('can be repeated, dropped, held, released last first, and reordered', async () => {
    await fake.control('POST', '/control/webhooks/conduct', { repeat: 3, drop: 1 });
    await paidOrder(fake, client);
    await fake.webhooksSettled();
    expect(shop.types).toEqual(PAID.slice(1).flatMap((type) => [type, type, type]));

    shop.received.length = 0;
    await fake.control('POST', '/control/webhooks/conduct', { repeat: 1 });
    await fake.control('POST', '/control/webhooks/hold');
    await paidOrder(fake, client);
    await fake.webhooksSettled();
    expect(shop.types).toEqual([]);
    await fake.control('POST', '/control/webhooks/release', { order: 'last-first' });
    await fake.webhooksSettled();
    expect(shop.types).toEqual(PAID.toReversed());

    shop.received.length = 0;
    await fake.control('POST', '/control/webhooks/conduct', { reorder_within: 50 });
    await paidOrder(fake, client);
    await fake.webhooksSettled();
    expect(shop.types).toEqual(PAID.toReversed());
  });

  it('can be released in an order of one’s own', async () => {
    await fake.control('POST', '/control/webhooks/hold');
    await paidOrder(fake, client);
    const { data } = await client.events.list();
    const events = [data[0]?.id, data[2]?.id];
    await fake.control('POST', '/control/webhooks/release', { events });
    await fake.webhooksSettled();
    expect(shop.types).toEqual([PAID[3], PAID[1], PAID[0], PAID[2]]);
  });
});

describe('a payment that settles later', () => {
  it('completes unpaid and succeeds afterwards', async () => {
    const { id } = await client.checkout.sessions.create(
      order({ allowed_payment_method_types: ['card', 'sepa_debit'] }),
    );
    await fake.control('POST', `/control/sessions/${id}/pay-later`);
    const waiting = await client.checkout.sessions.retrieve(id, { expand: ['payment_intent'] });
    expect([waiting.status, waiting.payment_status]).toEqual(['complete', 'unpaid']);
    expect(waiting.payment_intent).toMatchObject({ status: 'processing' });
    await fake.control('POST', `/control/sessions/${id}/settle`, { outcome: 'succeeded' });
    await fake.webhooksSettled();
    expect(shop.types.slice(-3)).toEqual([
      'charge.succeeded',
      'payment_intent.succeeded',
      'checkout.session.async_payment_succeeded',
    ]);
    expect((await client.checkout.sessions.retrieve(id)).payment_status).toBe('paid');
    await expect(fake.control('POST', `/control/sessions/${id}/settle`)).rejects.toThrow('409');
  });

  it('or fails afterwards and stays unpaid', async () => {
    const { id } = await client.checkout.sessions.create(order());
    await fake.control('POST', `/control/sessions/${id}/pay-later`);
    await fake.control('POST', `/control/sessions/${id}/settle`, { outcome: 'failed' });
    await fake.webhooksSettled();
    expect(shop.types.at(-1)).toBe('checkout.session.async_payment_failed');
    expect((await client.checkout.sessions.retrieve(id)).payment_status).toBe('unpaid');
  });
});

describe('after the payment', () => {
  it('a refund tells of itself and of the charge’s new sum', async () => {
    const { payment_intent } = await paidOrder(fake, client);
    const refund = await client.refunds.create({ payment_intent: idOf(payment_intent), amount: 500 });
    await fake.webhooksSettled();
    expect(shop.types.slice(-2)).toEqual(['refund.created', 'charge.refunded']);
    const event = verified(shop.received.length - 1);
    expect(event.data).toMatchObject({ object: { amount_refunded: 500 }, previous_attributes: { amount_refunded: 0 } });
    expect(event.request?.id).toMatch(/^req_/);
    expect(event.request?.idempotency_key).not.toBe('');
    expect(refund.status).toBe('succeeded');
  });

  it('a refund can be pending, succeed, or come back, and the money can be refunded again', async () => {
    const { payment_intent } = await paidOrder(fake, client);
    const all = { payment_intent: idOf(payment_intent) };
    await fake.control('POST', '/control/refunds/next-pending', { count: 2 });
    const first = await client.refunds.create({ ...all, amount: 5000 });
    const second = await client.refunds.create({ ...all, amount: 6000 });
    expect([first.status, second.status]).toEqual(['pending', 'pending']);
    await fake.control('POST', `/control/refunds/${first.id}/succeed`);
    await fake.control('POST', `/control/refunds/${second.id}/fail`, { reason: 'expired_or_canceled_card' });
    await fake.webhooksSettled();
    expect(shop.types.slice(-5)).toEqual([
      'charge.refund.updated',
      'refund.updated',
      'charge.refund.updated',
      'refund.updated',
      'refund.failed',
    ]);
    expect(await client.refunds.retrieve(second.id)).toMatchObject({
      status: 'failed',
      failure_reason: 'expired_or_canceled_card',
    });
    const charge = await client.charges.retrieve(idOf(second.charge));
    expect(charge.amount_refunded).toBe(5000);
    await expect(client.refunds.create({ ...all, amount: 15_800 })).resolves.toMatchObject({ amount: 15_800 });
  });

  it('a dispute takes the amount and a fee, refuses refunds, and gives the amount back when won', async () => {
    const { payment_intent, id } = await paidOrder(fake, client);
    const opened = (await fake.control('POST', `/control/charges/${id}/dispute`, {
      reason: 'product_not_received',
    })) as Stripe.Dispute;
    const refusal = client.refunds.create({ payment_intent: idOf(payment_intent) });
    await expect(refusal).rejects.toMatchObject({ code: 'charge_disputed' });
    await fake.control('POST', `/control/disputes/${opened.id}/answer`);
    await fake.control('POST', `/control/disputes/${opened.id}/close`, { outcome: 'won' });
    await fake.webhooksSettled();
    expect(shop.types.slice(-5)).toEqual([
      'charge.dispute.created',
      'charge.dispute.funds_withdrawn',
      'charge.dispute.updated',
      'charge.dispute.closed',
      'charge.dispute.funds_reinstated',
    ]);
    const dispute = await client.disputes.retrieve(opened.id);
    expect(dispute).toMatchObject({ status: 'won', reason: 'product_not_received', amount: 20_800 });
    expect(dispute.balance_transactions.map(({ amount, fee, net }) => [amount, fee, net])).toEqual([
      [-20_800, 2000, -22_800],
      [20_800, 0, 20_800],
    ]);
    expect((await client.disputes.list({ payment_intent: idOf(payment_intent) })).data).toHaveLength(1);
    expect((await client.charges.list()).data[0]?.disputed).toBe(true);
  });
});

describe('everything', () => {
  it('survives a restart with the webhooks still to be sent', async () => {
    const folder = await mkdtemp(`${tmpdir()}/payments-`);
    const kept = { stateFile: `${folder}/state/payments.json`, webhooks: [{ url: shop.url, secret: SECRET }] };
    const before = await startPayments(kept);
    await before.control('POST', '/control/webhooks/hold');
    const { id } = await paidOrder(before, clientOf(before));
    await before.close();
    expect(shop.types).toEqual([]);
    const after = await startPayments(kept);
    try {
      await after.webhooksSettled();
      expect(shop.types).toEqual(PAID);
      expect((await clientOf(after).checkout.sessions.retrieve(id)).payment_status).toBe('paid');
      const again = await clientOf(after).checkout.sessions.create(order(), { idempotencyKey: 'fresh' });
      expect(again.status).toBe('open');
    } finally {
      await after.close();
      await rm(folder, { recursive: true });
    }
  });
});
